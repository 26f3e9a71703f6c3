import { Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import { Button } from '../../../components/ui/button';
import { Message } from '../../../components/ui/message';
import { asProblem } from '../../../lib/api/problem';
import type { Me } from '../../../lib/api/types';
import { showFieldProblems } from '../../../lib/show-field-problems';
import { acceptInvitation, type LinkView } from '../api';
import { NewPasswordFields, type NewPassword } from './new-password-fields';

interface InvitationFormProps {
  token: string;
  link: LinkView;
  onSignedIn: (me: Me) => Promise<void>;
}

/** The password of somebody who was invited, or who lost theirs. The hidden e-mail is for password managers. */
export function InvitationForm({ token, link, onSignedIn }: InvitationFormProps) {
  const form = useForm<NewPassword>({ defaultValues: { password: '', repeated: '' } });
  const { handleSubmit, formState, setError } = form;
  const [refusal, setRefusal] = useState<string>();
  const send = handleSubmit(async ({ password }) => {
    setRefusal(undefined);
    try {
      await onSignedIn(await acceptInvitation({ token, password }));
    } catch (error) {
      setRefusal(showFieldProblems<NewPassword>(asProblem(error), ['password'], setError));
    }
  });
  return (
    <FormProvider {...form}>
      <form onSubmit={(event) => void send(event)} noValidate>
        <Stack gap="4">
          <p>
            {link.name && <strong>{link.name}, </strong>}choose the password for {link.email}.
          </p>
          <input
            type="text"
            name="username"
            autoComplete="username"
            value={link.email ?? ''}
            readOnly
            hidden
          />
          <NewPasswordFields />
          {refusal && <Message tone="wrong">{refusal}</Message>}
          <Button type="submit" kind="go" size="lg" wide busy={formState.isSubmitting}>
            Set password and sign in
          </Button>
        </Stack>
      </form>
    </FormProvider>
  );
}
