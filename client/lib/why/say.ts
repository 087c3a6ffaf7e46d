import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';

/** Masses, arms, areas and moments in one reader's units. */
export const sayIn = (units: Units) => ({
  grams: (value: number) => units.format(value, 'mass', { fine: true }),
  doubt: (value: number) => units.doubt(value, 'mass', { fine: true }),
  mm: (value: number) => units.format(value, 'length'),
  area: (value: number) => units.format(value, 'area'),
  moment: (value: number) => units.format(value, 'moment'),
  loading: (value: number) => units.format(value, 'loading', { fine: true }),
  speed: (value: number) => units.format(value, 'speed', { fine: true }),
});

export const percent = (value: number, digits = 1) => `${formatNumber(value, digits)}${NARROW_SPACE}%`;

/** What is first order in quadrature, and where that is written down. */
export const IN_QUADRATURE = 'in quadrature (JCGM 100:2008, 5.1.2)';
