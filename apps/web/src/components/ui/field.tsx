import { Field as Parts } from '@chakra-ui/react';
import type { ReactNode } from 'react';

interface FieldProps {
  label: ReactNode;
  /** What to enter, or why it is asked; stays when an error is shown. */
  help?: ReactNode;
  /** What is wrong with what was entered, and the cure. */
  error?: string | undefined;
  required?: boolean;
  children: ReactNode;
}

/**
 * A form's field: label, the control given as child, help and error beside it, tied together for screen readers.
 * The child is a Chakra control (`Input`, `Textarea`, `NativeSelect`).
 */
export function Field({ label, help, error, required = false, children }: FieldProps) {
  return (
    <Parts.Root invalid={Boolean(error)} required={required}>
      <Parts.Label fontWeight="600">{label}</Parts.Label>
      {children}
      {error && (
        <Parts.ErrorText fontSize="sm" role="alert">
          {error}
        </Parts.ErrorText>
      )}
      {help && <Parts.HelperText fontSize="sm">{help}</Parts.HelperText>}
    </Parts.Root>
  );
}
