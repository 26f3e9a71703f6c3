import { Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import { Button } from '../../../components/ui/button';
import { Field } from '../../../components/ui/field';
import { Input } from '../../../components/ui/input';
import { Message } from '../../../components/ui/message';
import { asProblem } from '../../../lib/api/problem';
import type { Me } from '../../../lib/api/types';
import { showFieldProblems } from '../../../lib/show-field-problems';
import { makeFirstAdministrator } from '../api';
import { NewPasswordFields, type NewPassword } from './new-password-fields';

interface Entries extends NewPassword {
  name: string;
  email: string;
}

interface FirstAdministratorFormProps {
  token: string;
  onSignedIn: (me: Me) => Promise<void>;
}

/** The first person of an empty installation: name, e-mail, password. */
export function FirstAdministratorForm({ token, onSignedIn }: FirstAdministratorFormProps) {
  const form = useForm<Entries>({ defaultValues: { name: '', email: '', password: '', repeated: '' } });
  const { register, handleSubmit, formState, setError } = form;
  const { errors } = formState;
  const [refusal, setRefusal] = useState<string>();
  const send = handleSubmit(async ({ name, email, password }) => {
    setRefusal(undefined);
    try {
      await onSignedIn(await makeFirstAdministrator({ token, name, email, password }));
    } catch (error) {
      setRefusal(showFieldProblems<Entries>(asProblem(error), ['name', 'email', 'password'], setError));
    }
  });
  return (
    <FormProvider {...form}>
      <form onSubmit={(event) => void send(event)} noValidate>
        <Stack gap="4">
          <Field label="Your name" error={errors.name?.message} required>
            <Input autoComplete="name" {...register('name', { required: 'Write your name.' })} />
          </Field>
          <Field label="E-mail" error={errors.email?.message} required>
            <Input
              type="email"
              autoComplete="username"
              {...register('email', { required: 'Write your e-mail.' })}
            />
          </Field>
          <NewPasswordFields />
          {refusal && <Message tone="wrong">{refusal}</Message>}
          <Button type="submit" kind="go" size="lg" wide busy={formState.isSubmitting}>
            Become the administrator
          </Button>
        </Stack>
      </form>
    </FormProvider>
  );
}
