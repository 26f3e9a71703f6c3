import { Field } from './field';
import { Input } from './input';

interface PasswordFieldProps {
  label: string;
  value: string;
  onChange: (password: string) => void;
  error?: string | undefined;
}

/** Asks somebody who is signed in for their password again; password managers fill it in. */
export function PasswordField({ label, value, onChange, error }: PasswordFieldProps) {
  return (
    <Field label={label} error={error} required>
      <Input
        type="password"
        autoComplete="current-password"
        value={value}
        onChange={({ target }) => onChange(target.value)}
      />
    </Field>
  );
}
