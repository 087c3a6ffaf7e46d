import { ApiError } from './api.ts';

/** What the server refused, at the fields of a form and for the form as a whole. */
export interface Refusal<K extends string> {
  fields: [field: K, message: string][];
  root: string | null;
}

/**
 * A refusal by field: `#/email` goes to `email`. What belongs to no field, or is no refusal at all, goes to the form
 * itself.
 */
export function refusalOf<K extends string>(error: unknown, names: readonly K[]): Refusal<K> {
  const fields: [K, string][] = [];
  const rest: string[] = [];
  for (const { pointer, detail } of error instanceof ApiError ? error.fields : []) {
    const name = names.find((one) => pointer === `#/${one.replaceAll('.', '/')}`);
    if (name === undefined) rest.push(detail);
    else if (!fields.some(([taken]) => taken === name)) fields.push([name, detail]);
  }
  if (fields.length === 0 && rest.length === 0) {
    rest.push(error instanceof Error ? error.message : 'That did not work.');
  }
  return { fields, root: rest.length === 0 ? null : rest.join(' ') };
}
