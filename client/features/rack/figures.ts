import { densityOf } from '#shared/core/grades.ts';
import { volumeOfStock } from '#shared/core/stock.ts';
import type { Units } from '#shared/format/units.ts';
import { convert } from '#shared/units/units.ts';
import type { StockMaterial, StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { gradeWord, type Measured } from './words.ts';

type Unfinished = { [K in keyof Measured]: Measured[K] | null };

/** Density in kg/m³ of sizes in mm and a mass in g as they stand in a form; null until all of them are there. */
export function densityWhileTyping(size: Unfinished, mass: number | null): number | null {
  const { kind, length, width, wall } = size;
  const thickness = kind === 'tube' ? width : size.thickness;
  if (kind === null || !isSize(length) || !isSize(width) || !isSize(thickness) || !isSize(mass)) return null;
  if (kind === 'tube' && wall !== null && !(wall > 0 && wall <= width / 2)) return null;
  return densityOf(mass, volumeOfStock({ kind, length, width, thickness, wall }));
}

const isSize = (value: number | null): value is number =>
  value !== null && Number.isFinite(value) && value > 0;

/** `142 kg/m³, medium` */
export function densityText(material: StockMaterial, density: number | null, units: Units): string {
  const grade = gradeWord(material, density);
  return `${units.format(density, 'density')}${grade === null ? '' : `, ${grade}`}`;
}

/** `34 pieces, 1 210 g; lightest sheet 78 kg/m³`, of what is shown. */
export function rackHeadline(pieces: readonly StockPieceDto[], more: boolean, units: Units): string {
  const count = `${pieces.length} ${pieces.length === 1 ? 'piece' : 'pieces'}${more ? ' so far' : ''}`;
  const weighed = pieces.flatMap(({ mass }) => (mass === null ? [] : [mass]));
  const without = pieces.length - weighed.length;
  const mass = weighed.reduce((sum, one) => sum + one, 0);
  const sheets = pieces.flatMap(({ kind, density }) =>
    kind === 'sheet' && density !== null ? [density] : [],
  );
  return [
    [count, ...(weighed.length > 0 ? [units.format(mass, 'mass')] : [])].join(', '),
    ...(sheets.length > 0 ? [`lightest sheet ${units.format(Math.min(...sheets), 'density')}`] : []),
    ...(without > 0 ? [`${without} without a mass`] : []),
  ].join('; ');
}

const STEPS = [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000, 5000];

/** Lines of a scale of densities from 0 past the largest, kg/m³: round figures in the reader's unit. */
export function densityTicks(largest: number, units: Units): number[] {
  const unit = units.unit('density') as 'kg/m3';
  const end = convert(largest, 'kg/m3', unit);
  // Where the unit is large the steps are hundredths.
  const fine = end < 4 ? 0.01 : 1;
  const step = (STEPS.find((one) => end / (one * fine) <= 5) ?? 10_000) * fine;
  return Array.from({ length: Math.ceil(end / step) + 1 }, (_, i) => convert(i * step, unit, 'kg/m3'));
}
