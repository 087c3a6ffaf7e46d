import { Decimal } from 'decimal.js';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { csvTable, type Cell } from './csv.ts';

const text = (value: string | null): Cell => (value === null || value === '' ? null : { text: value });
/** Every digit, and never as a power of ten. */
const figure = (value: number | null): Cell =>
  value === null ? null : { number: new Decimal(value).toFixed() };

/** Titles that the reader of such files knows, and what stands below them. Lengths in mm, masses in g. */
const COLUMNS: readonly [string, (piece: StockPieceDto) => Cell][] = [
  ['Number', ({ number }) => figure(number)],
  ['Kind', ({ kind }) => text(kind)],
  ['Material', ({ material }) => text(material.name)],
  ['Category', ({ material }) => text(material.category)],
  ['Material key', ({ material }) => text(material.key)],
  ['Length (mm)', ({ length }) => figure(length)],
  ['Width (mm)', ({ width }) => figure(width)],
  ['Thickness (mm)', ({ thickness }) => figure(thickness)],
  ['Wall (mm)', ({ wall }) => figure(wall)],
  ['Mass (g)', ({ mass }) => figure(mass)],
  ['Scale step (g)', ({ resolution }) => figure(resolution)],
  ['Density (kg/m3)', ({ density }) => (density === null ? null : { number: density.toFixed(1) })],
  ['Grade', ({ grade }) => text(grade)],
  ['Grain cut', ({ grainCut }) => text(grainCut)],
  ['Note', ({ note }) => text(note)],
  ['State', ({ state }) => text(state)],
];

/** Pieces of a rack as a table that can be taken in again. */
export function rackCsv(pieces: readonly StockPieceDto[]): string {
  return csvTable([
    COLUMNS.map(([title]) => ({ text: title })),
    ...pieces.map((piece) => COLUMNS.map(([, cell]) => cell(piece))),
  ]);
}
