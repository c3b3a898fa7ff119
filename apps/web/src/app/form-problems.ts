import type { FieldValues, Path, UseFormSetError } from 'react-hook-form';
import { ApiProblem, errorSentence } from './api-problem';

/**
 * Puts what the server found wrong beside the fields it names.
 * @param fields names the form shows.
 * @returns the sentence for the head of the form, or null when every complaint found its field.
 */
export function showProblems<V extends FieldValues>(
  error: unknown,
  fields: readonly string[],
  setError: UseFormSetError<V>,
): string | null {
  const errors = error instanceof ApiProblem ? error.errors : [];
  const known = errors.filter(({ path }) => fields.includes(path));
  known.forEach(({ path, message }, i) => setError(path as Path<V>, { message }, { shouldFocus: i === 0 }));
  if (known.length > 0 && known.length === errors.length) return null;
  return errors.find(({ path }) => !fields.includes(path))?.message ?? errorSentence(error);
}
