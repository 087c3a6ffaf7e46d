import { SectionRefused } from './findings.ts';

/** A point of a coordinate text with the line that it stands on, counted from 1. */
export interface Coordinate {
  x: number;
  z: number;
  line: number;
  /** what stands there, short enough to be told */
  text: string;
}

/** Points as they stand in a text, parted where it has empty lines. */
export interface CoordinateText {
  /** the line before the numbers, if there is one */
  title: string | null;
  blocks: Coordinate[][];
}

/** More lines than any section has; a file of another kind is refused before it is read. */
const MOST_LINES = 20_000;
const SHOWN = 32;
const NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?$/;

/**
 * The numbers of one line. Spaces, tabs, semicolons and bars part them; a comma is the decimal mark where something
 * else parts the numbers or where it takes three commas to write two of them, and parts them otherwise. Null where
 * something is no number.
 * @example numbersIn('0,5; -0,03') // → [0.5, -0.03]
 * @example numbersIn('0.5,-0.03') // → [0.5, -0.03]
 * @example numbersIn('0,5,0,03') // → [0.5, 0.03]
 */
export function numbersIn(line: string): number[] | null {
  const plain = line.replaceAll('\u2212', '-').trim();
  const words = plain.split(/[\s;|]+/).filter((word) => word !== '');
  const tokens = words.flatMap((word) => commaTokens(word.replace(/^,|,$/g, ''), words.length > 1));
  const numbers = tokens.map((token) => (NUMBER.test(token) ? Number(token) : Number.NaN));
  return numbers.some((number) => !Number.isFinite(number)) ? null : numbers;
}

/** Numbers of one word with commas in it. */
function commaTokens(word: string, parted: boolean): string[] {
  const pieces = word.split(',');
  if (pieces.length === 1) return word === '' ? [] : [word];
  if (word.includes('.')) return pieces;
  if (parted && pieces.length === 2) return [pieces.join('.')];
  const [a, b, c, d] = pieces;
  return pieces.length === 4 ? [`${a}.${b}`, `${c}.${d}`] : pieces;
}

/** Reads the points of a text line by line, without asking yet what they mean. */
export function coordinatesIn(text: string): CoordinateText {
  const lines = text.replace(/^\uFEFF/, '').split(/\r\n|\r|\n/);
  if (lines.length > MOST_LINES) throw new SectionRefused({ code: 'too_many_lines', most: MOST_LINES });
  const blocks: Coordinate[][] = [];
  let title: string | null = null;
  let isOpen = false;
  for (const [i, raw] of lines.entries()) {
    const content = raw.replace(/(?:#|!|\/\/).*$/, '').trim();
    if (content === '') {
      // A line of nothing but a remark parts no points.
      if (raw.trim() === '') isOpen = false;
      continue;
    }
    const [x, z, ...rest] = numbersIn(content) ?? [];
    const shown = content.length > SHOWN ? `${content.slice(0, SHOWN)}…` : content;
    if (x === undefined || z === undefined || rest.some((other) => other !== 0)) {
      // Only before the first numbers may something else stand: what the section is called.
      if (blocks.length > 0) throw new SectionRefused({ code: 'not_two_numbers', line: i + 1, text: shown });
      title ??= content;
      continue;
    }
    const point: Coordinate = { x, z, line: i + 1, text: shown };
    const last = blocks.at(-1);
    if (isOpen && last) last.push(point);
    else blocks.push([point]);
    isOpen = true;
  }
  return { title, blocks };
}
