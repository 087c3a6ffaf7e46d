import {
  BUY_WEIGHT,
  grams,
  MATCHED_MASS_WEIGHT,
  matchedSurfaces,
  meanArm,
  OVER_WEIGHT,
  type AssignProblem,
} from './assign-account.ts';
import type { CutPart } from './cut-parts.ts';
import { misfit, type CutStock } from './stock-fit.ts';

/** Parts that do not all lie on one of these pieces. */
export interface Crowd {
  parts: readonly string[];
  stock: readonly string[];
}

/** A mixed-integer programme in LP format, and what its columns mean. */
export interface AssignModel {
  lp: string;
  /** column to part and piece */
  columns: ReadonlyMap<string, { part: string; stock: string }>;
}

const number = (value: number) => value.toPrecision(12);
const term = (factor: number, column: string) =>
  `${factor < 0 ? '-' : '+'} ${number(Math.abs(factor))} ${column}`;

/**
 * The assignment as a mixed-integer programme: a column x for each part on each piece that it can be cut from, u for
 * a part that is bought instead. A piece holds no more than its area (a stick its length), which parts laid by strips
 * never need more than; what was found not to lie together is kept apart by `crowds`. The least value of the
 * objective is the `score` of the best choice.
 * @example assignModel(EXAMPLE_ASSIGNMENT, []).columns.get('x0_0') // → { part: 'rib port', stock: '1' }
 */
export function assignModel(
  { parts, stock, terms, fixed }: AssignProblem,
  crowds: readonly Crowd[],
): AssignModel {
  const columns = new Map<string, { part: string; stock: string }>();
  const onStock = new Map<string, { column: string; part: CutPart }[]>();
  const ofPart = new Map<string, { column: string; piece: CutStock }[]>();
  parts.forEach((part, i) => {
    const own: { column: string; piece: CutStock }[] = [];
    stock.forEach((piece, j) => {
      if (misfit(part, piece)) return;
      const column = `x${i}_${j}`;
      columns.set(column, { part: part.id, stock: piece.id });
      own.push({ column, piece });
      onStock.set(piece.id, [...(onStock.get(piece.id) ?? []), { column, part }]);
    });
    ofPart.set(part.id, own);
  });
  const massOf = (part: CutPart, i: number, times = 1) => [
    ...(ofPart.get(part.id) ?? []).map(({ column, piece }) =>
      term(times * grams(part, piece.density), column),
    ),
    term(times * grams(part, part.density), `u${i}`),
  ];
  const matched = matchedSurfaces(parts);
  const rows: string[] = [];
  const row = (left: string | readonly string[], right: string) =>
    rows.push(`${typeof left === 'string' ? left : left.join(' ')} ${right}`);

  parts.forEach((part, i) => {
    row([...(ofPart.get(part.id) ?? []).map(({ column }) => `+ ${column}`), `+ u${i}`], '= 1');
    const by = fixed.get(part.id);
    const own = ofPart.get(part.id)?.find(({ piece }) => piece.id === by);
    if (own) row(own.column, '= 1');
  });
  for (const piece of stock) {
    const own = onStock.get(piece.id) ?? [];
    if (own.length > 0)
      row(
        own.map(({ column, part }) => term(room(part, piece, terms.kerf), column)),
        `<= ${number(room(piece, piece, terms.kerf))}`,
      );
  }
  for (const { parts: apart, stock: pieces } of crowds) {
    for (const id of pieces) {
      const own = (onStock.get(id) ?? []).filter(({ part }) => apart.includes(part.id));
      if (own.length === apart.length)
        row(
          own.map(({ column }) => `+ ${column}`),
          `<= ${apart.length - 1}`,
        );
    }
  }
  const objective: string[] = parts.map((_, i) => term(BUY_WEIGHT, `u${i}`));
  matched.forEach((surface, f) => {
    const arm = meanArm(parts, surface);
    for (const [name, weight, tolerance] of [
      ['m', () => 1, terms.massTolerance],
      [
        'y',
        (part: CutPart) => part.y / arm,
        terms.momentTolerance === null ? null : terms.momentTolerance / arm,
      ],
    ] as const) {
      const difference = (sign: number) =>
        parts.flatMap((part, i) => {
          if (part.surface !== surface || part.side === 'middle') return [];
          return massOf(part, i, sign * weight(part) * (part.side === 'port' ? 1 : -1));
        });
      row([...difference(1), `- d${name}${f}`], '<= 0');
      row([...difference(-1), `- d${name}${f}`], '<= 0');
      if (terms.aim === 'matched') objective.push(`+ d${name}${f}`);
      if (tolerance === null) continue;
      row(`d${name}${f} - o${name}${f}`, `<= ${number(tolerance)}`);
      objective.push(term(OVER_WEIGHT, `o${name}${f}`));
    }
  });
  const spars = parts.filter(({ isSpar }) => isSpar);
  if (terms.aim === 'strongest' && spars.length > 0) {
    for (const part of spars) {
      const own = ofPart.get(part.id) ?? [];
      const bought = `- ${number(part.density)} u${parts.indexOf(part)}`;
      row(['t', ...own.map(({ column, piece }) => `- ${number(piece.density)} ${column}`), bought], '<= 0');
    }
    objective.push('- t');
  }
  const massWeight = terms.aim === 'matched' ? MATCHED_MASS_WEIGHT : 1;
  objective.push(...parts.flatMap((part, i) => massOf(part, i, massWeight)));
  return { lp: written(merged(objective), rows, [...columns.keys()]), columns };
}

/** What a part takes of a piece with its cut, or what the piece has: mm², of a stick mm. */
function room(part: { length: number; width: number }, piece: CutStock, kerf: number): number {
  return piece.form === 'stick' ? part.length + kerf : (part.length + kerf) * (part.width + kerf);
}

/** The LP format takes a column once in the objective. */
function merged(terms: readonly string[]): string[] {
  const sums = new Map<string, number>();
  for (const each of terms) {
    const [sign, ...rest] = each.split(' ');
    const column = rest.at(-1) ?? '';
    const factor = rest.length > 1 ? Number(rest[0]) : 1;
    sums.set(column, (sums.get(column) ?? 0) + (sign === '-' ? -factor : factor));
  }
  return [...sums].map(([column, factor]) => term(factor, column));
}

function written(objective: readonly string[], rows: readonly string[], binaries: readonly string[]): string {
  return [
    'Minimize',
    ...chunks(` obj: ${objective.join(' ')}`),
    'Subject To',
    ...rows.flatMap((each, i) => chunks(` r${i}: ${each}`)),
    ...(binaries.length > 0 ? ['Binary', ...binaries.map((column) => ` ${column}`)] : []),
    'End',
    '',
  ].join('\n');
}

/** Terms on a line of their own: lines of the format are short. */
const chunks = (line: string): string[] => line.split(/ (?=[+-] )/);
