import type { FieldValues, Path, UseFormSetError } from 'react-hook-form';
import { refusalOf } from './refusal.ts';

/** Puts what the server refused at the fields of a form, or at its root. */
export function showRefusal<T extends FieldValues>(
  error: unknown,
  fields: readonly Path<T>[],
  setError: UseFormSetError<T>,
): void {
  const refusal = refusalOf(error, fields);
  for (const [i, [field, message]] of refusal.fields.entries()) {
    setError(field, { type: 'server', message }, { shouldFocus: i === 0 });
  }
  if (refusal.root !== null) setError('root', { type: 'server', message: refusal.root });
}
