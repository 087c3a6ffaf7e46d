import type { GliderSummaryDto } from '#shared/schemas/glider.ts';

export const BENCH_ORDERS = [
  { value: 'changed', label: 'Last change' },
  { value: 'name', label: 'Name' },
  { value: 'mass', label: 'Mass' },
  { value: 'balance', label: 'Balance' },
  { value: 'loading', label: 'Wing loading' },
] as const;
export type BenchOrder = (typeof BENCH_ORDERS)[number]['value'];

/** Newest first, names by the alphabet, figures from small to large with what is not known last. */
export function inOrder(gliders: readonly GliderSummaryDto[], order: BenchOrder): GliderSummaryDto[] {
  const byName = (a: GliderSummaryDto, b: GliderSummaryDto) =>
    a.name.localeCompare(b.name, 'en', { numeric: true });
  const byFigure =
    (figure: (glider: GliderSummaryDto) => number | null) => (a: GliderSummaryDto, b: GliderSummaryDto) =>
      (figure(a) ?? Infinity) - (figure(b) ?? Infinity) || byName(a, b);
  const compare = {
    changed: (a: GliderSummaryDto, b: GliderSummaryDto) => b.updatedAt.localeCompare(a.updatedAt),
    name: byName,
    mass: byFigure(({ figures }) => figures.mass),
    balance: byFigure(({ figures }) => figures.percentMac),
    loading: byFigure(({ figures }) => figures.wingLoading),
  }[order];
  return [...gliders].sort(compare);
}
