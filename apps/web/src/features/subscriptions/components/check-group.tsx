import { useId, type ReactNode } from 'react';
import type { UseFormRegisterReturn } from 'react-hook-form';

interface CheckGroupProps {
  legend: ReactNode;
  choices: readonly { value: string; label: ReactNode }[];
  field: UseFormRegisterReturn;
  type?: 'checkbox' | 'radio';
  error?: string | undefined;
}

/** A question with several boxes to tick, or one of several to choose; what is wrong stands beneath. */
export function CheckGroup({ legend, choices, field, type = 'checkbox', error }: CheckGroupProps) {
  const id = useId();
  return (
    <fieldset className="field" aria-describedby={error ? id : undefined}>
      <legend>{legend}</legend>
      {choices.map(({ value, label }) => (
        <label key={value} className="choice">
          <input type={type} value={value} aria-invalid={error ? true : undefined} {...field} />
          <span>{label}</span>
        </label>
      ))}
      {error && (
        <p id={id} className="error" role="alert">
          {error}
        </p>
      )}
    </fieldset>
  );
}
