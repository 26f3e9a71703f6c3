import { useFormContext } from 'react-hook-form';
import { Field } from '../../../components/ui/field';
import { Input } from '../../../components/ui/input';

/** What a form with a new password holds, among other things. */
export interface NewPassword {
  password: string;
  repeated: string;
}

/** A new password, twice: a slip of the finger would lock its owner out. */
export function NewPasswordFields() {
  const { register, formState, getValues } = useFormContext<NewPassword>();
  const { errors } = formState;
  return (
    <>
      <Field
        label="Password"
        help="At least 12 characters; a few words that only you would put together are good."
        error={errors.password?.message}
        required
      >
        <Input
          type="password"
          autoComplete="new-password"
          {...register('password', {
            required: 'Choose a password.',
            minLength: { value: 12, message: 'Use at least 12 characters.' },
          })}
        />
      </Field>
      <Field label="Password again" error={errors.repeated?.message} required>
        <Input
          type="password"
          autoComplete="new-password"
          {...register('repeated', {
            validate: (again) => again === getValues('password') || 'The two passwords differ.',
          })}
        />
      </Field>
    </>
  );
}
