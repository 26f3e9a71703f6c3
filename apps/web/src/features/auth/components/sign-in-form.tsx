import { Stack } from '@chakra-ui/react';
import { useForm } from 'react-hook-form';
import { Button } from '../../../components/ui/button';
import { Field } from '../../../components/ui/field';
import { Input } from '../../../components/ui/input';
import { Message } from '../../../components/ui/message';
import type { Me } from '../../../lib/api/types';
import { useAct } from '../../../lib/use-act';
import { signIn, type Credentials } from '../api';

interface SignInFormProps {
  /** Filled in already, where it is known who was signed in. */
  email?: string;
  onSignedIn: (me: Me) => void | Promise<void>;
}

/** E-mail and password. A refusal says the same for an unknown e-mail and a wrong password; the e-mail stays. */
export function SignInForm({ email = '', onSignedIn }: SignInFormProps) {
  const { register, handleSubmit, formState, resetField } = useForm<Credentials>({
    defaultValues: { email, password: '' },
  });
  const { run, busy, problem } = useAct(signIn);
  const { errors } = formState;
  const send = handleSubmit(async (credentials) => {
    const me = await run(credentials);
    if (me) await onSignedIn(me);
    else resetField('password');
  });
  return (
    <form onSubmit={(event) => void send(event)} noValidate>
      <Stack gap="4">
        <Field label="E-mail" error={errors.email?.message} required>
          <Input
            type="email"
            autoComplete="username"
            {...register('email', { required: 'Write your e-mail.' })}
          />
        </Field>
        <Field label="Password" error={errors.password?.message} required>
          <Input
            type="password"
            autoComplete="current-password"
            {...register('password', { required: 'Write your password.' })}
          />
        </Field>
        {problem && <Message tone="wrong">{problem.message}</Message>}
        <Button type="submit" kind="go" size="lg" wide busy={busy}>
          Sign in
        </Button>
      </Stack>
    </form>
  );
}
