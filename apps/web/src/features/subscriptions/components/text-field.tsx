import { useId, type ComponentProps } from 'react';
import type { UseFormRegisterReturn } from 'react-hook-form';

interface TextFieldProps extends Pick<ComponentProps<'input'>, 'type' | 'inputMode' | 'autoComplete'> {
  label: string;
  help?: string;
  error?: string | undefined;
  field: UseFormRegisterReturn;
}

/** A line to fill in, with its label, its help, and what is wrong with it, tied together for screen readers. */
export function TextField({ label, help, error, field, ...input }: TextFieldProps) {
  const id = useId();
  const described = [error && `${id}-error`, help && `${id}-help`].filter(Boolean).join(' ');
  return (
    <div className="field">
      <label htmlFor={id}>{label}</label>
      <input
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={described || undefined}
        {...input}
        {...field}
      />
      {error && (
        <p id={`${id}-error`} className="error" role="alert">
          {error}
        </p>
      )}
      {help && (
        <p id={`${id}-help`} className="help">
          {help}
        </p>
      )}
    </div>
  );
}
