import type { FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';
import type { ApiProblem } from './api/problem';

/**
 * Puts what the service found wrong beside the fields it names; returns what has no field of its own, to be said above
 * the button.
 */
export function showFieldProblems<T extends FieldValues>(
  problem: ApiProblem,
  fields: readonly FieldPath<T>[],
  setError: UseFormSetError<T>,
): string | undefined {
  const own = problem.errors.filter(({ field }) => (fields as readonly string[]).includes(field));
  own.forEach(({ field, text }) => setError(field as FieldPath<T>, { type: 'service', message: text }));
  return own.length > 0 ? undefined : problem.message;
}
