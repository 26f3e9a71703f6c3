import type { ReactNode } from 'react';
import { get, useFormContext, type FieldError } from 'react-hook-form';

/** What every entry of a form has. */
export interface EntryProps {
  /** The field's path in the form, and in the service's answers. */
  name: string;
  label: ReactNode;
  help?: ReactNode;
  required?: boolean;
}

/** A field's registration in the surrounding form, and what is wrong with it. */
export function useEntry({ name, required = false }: EntryProps) {
  const { register, formState } = useFormContext();
  const error = (get(formState.errors, name) as FieldError | undefined)?.message;
  const rules = required ? { required: 'This is needed.' } : {};
  return { register, rules, error };
}
