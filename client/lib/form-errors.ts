import type { FieldValues, Path, UseFormSetError } from 'react-hook-form';
import { ApiError } from './api.ts';

/**
 * Puts what the server refused at the fields of a form: `#/email` goes to `email`. What belongs to no field, or
 * is no refusal at all, goes to the form's root.
 */
export function showRefusal<T extends FieldValues>(
  error: unknown,
  fields: readonly Path<T>[],
  setError: UseFormSetError<T>,
): void {
  const rest: string[] = [];
  let placed = false;
  if (error instanceof ApiError) {
    for (const { pointer, detail } of error.fields) {
      const field = fields.find((name) => pointer === `#/${name.replaceAll('.', '/')}`);
      if (field) {
        setError(field, { type: 'server', message: detail }, { shouldFocus: !placed });
        placed = true;
      } else {
        rest.push(detail);
      }
    }
  }
  if (!placed && rest.length === 0) rest.push(error instanceof Error ? error.message : 'That did not work.');
  if (rest.length > 0) setError('root', { type: 'server', message: rest.join(' ') });
}
