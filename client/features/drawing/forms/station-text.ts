import { NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import type { Parsed } from './parsed-field.tsx';

/** Stations as a list to read and to edit: `0; 42.5; 85`. */
export function stationsText(stations: readonly number[], units: Units): string {
  return stations
    .map((s) => units.size(s, { bare: true, exact: true }).replaceAll(NARROW_SPACE, ''))
    .join('; ');
}

/**
 * Reads a list of stations. With semicolons or line breaks between them each may be written like any length
 * (`1 1/2 in`); without, spaces part them.
 */
export function parseStations(text: string, units: Units): Parsed<number[]> {
  const pieces = /[;\n]/.test(text) ? text.split(/[;\n]/) : text.split(/\s+/);
  const wanted = pieces.map((piece) => piece.trim()).filter((piece) => piece !== '');
  if (wanted.length === 0) return { problem: 'Type at least one station.' };
  const stations: number[] = [];
  for (const piece of wanted) {
    const read = parseQuantity(piece, 'length', units.unit('length'));
    if (!('value' in read)) return { problem: `“${piece}” is not a length. Write 0; 42.5; 85.` };
    stations.push(read.value);
  }
  return { value: stations };
}
