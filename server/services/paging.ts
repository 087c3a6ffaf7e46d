import type { z } from 'zod';
import { invalidInput } from '#server/errors.ts';

/** What a page of a list is asked with. */
export interface PageQuery {
  cursor?: string | undefined;
  limit: number;
}

/** A cursor is the place of the last row shown, for the client opaque. */
export function encodeCursor(place: readonly (string | number)[]): string {
  return Buffer.from(JSON.stringify(place)).toString('base64url');
}

/** @throws AppError `invalid_input` for a cursor that is not of ours */
export function decodeCursor<T>(cursor: string | undefined, place: z.ZodType<T>): T | undefined {
  if (cursor === undefined) return undefined;
  try {
    return place.parse(JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8')));
  } catch {
    throw invalidInput([{ pointer: '#/cursor', detail: 'Is not a cursor of this list.' }]);
  }
}

/**
 * Cuts rows that were read one beyond the limit into a page.
 * @returns the page's rows and the cursor to the next; null on the last page
 */
export function pageOf<T>(
  rows: readonly T[],
  limit: number,
  placeOf: (row: T) => readonly (string | number)[],
): { rows: T[]; nextCursor: string | null } {
  const page = rows.slice(0, limit);
  const last = page.at(-1);
  return { rows: page, nextCursor: rows.length > limit && last ? encodeCursor(placeOf(last)) : null };
}
