import { get, useFormState } from 'react-hook-form';
import type { FieldError } from 'react-hook-form';

/** What is wrong with a field, in words. */
export function useFieldError(name: string): string | undefined {
  const { errors } = useFormState();
  const error = get(errors, name) as FieldError | undefined;
  return error && (error.message || 'Please check this.');
}
