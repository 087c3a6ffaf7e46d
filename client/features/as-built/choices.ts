import { sidedLines, type BuiltSide, type SidedLine } from '#shared/core/built/sided-lines.ts';
import type { Part, Plan, Surface } from '#shared/core/plan.ts';
import type { BuildStage } from '#shared/schemas/weighing.ts';

/** Something that can be put on the scale. */
export interface Choice {
  /** what a label on the part may say, and what is kept of it: `wing/ribs port`, `wing port framed` */
  code: string;
  label: string;
  stage: BuildStage;
  covers: { line: string; side: BuiltSide }[];
}

const SIDES = { port: ', port', starboard: ', starboard', middle: '' } as const;

/** Parts that are on a half at each stage; what comes later is not on it yet. */
const LATER: Record<'framed' | 'sheeted', ReadonlySet<Part['kind']>> = {
  framed: new Set(['skin', 'covering', 'finish']),
  sheeted: new Set(['covering', 'finish']),
};
const STAGES = ['framed', 'sheeted', 'covered'] as const;

/**
 * Everything of a plan that can be weighed: each part on its side, a part of both halves together, each surface or
 * half of one at each stage, and the whole model.
 */
export function choicesOf(plan: Plan): Choice[] {
  const lines = sidedLines(plan);
  const parts = lines.map((line): Choice => ({
    code: `${line.line} ${line.side}`,
    label: lineLabel(plan, line),
    stage: 'part',
    covers: [coverOf(line)],
  }));
  const pairs = lines.flatMap((line): Choice[] => {
    const other = lines.find((one) => one.line === line.line && one.side === 'starboard');
    if (line.side !== 'port' || !other) return [];
    return [
      {
        code: `${line.line} both`,
        label: `${line.name}, both halves${groupOf(plan, line)}`,
        stage: 'part',
        covers: [coverOf(line), coverOf(other)],
      },
    ];
  });
  const model: Choice = {
    code: 'model',
    label: 'The whole model',
    stage: 'model',
    covers: lines.map(coverOf),
  };
  return [...parts, ...pairs, ...plan.surfaces.flatMap((surface) => halves(surface, lines)), model];
}

/** A part on its side as the builder calls it. */
export const lineLabel = (plan: Plan, line: Pick<SidedLine, 'name' | 'side' | 'surface'>): string =>
  `${line.name}${SIDES[line.side]}${groupOf(plan, line)}`;

const coverOf = ({ line, side }: SidedLine) => ({ line, side });

/** Of surfaces other than the first wing it is said which: several have a leading edge. */
function groupOf(plan: Plan, { surface }: Pick<SidedLine, 'surface'>): string {
  const index = plan.surfaces.findIndex(({ key }) => key === surface);
  return index > 0 ? ` (${plan.surfaces[index]?.key ?? ''})` : '';
}

function halves(surface: Surface, lines: readonly SidedLine[]): Choice[] {
  const kinds = new Map(surface.parts.map((part) => [`${surface.key}/${part.id}`, part.kind]));
  const sides = surface.mirrored ? (['port', 'starboard', 'both'] as const) : (['middle'] as const);
  const has = (stage: (typeof STAGES)[number]) =>
    stage === 'framed' ||
    surface.parts.some(({ kind }) => (stage === 'sheeted' ? kind === 'skin' : LATER.sheeted.has(kind)));
  return sides.flatMap((side) =>
    STAGES.filter(has).map((stage): Choice => {
      const name = surface.key.charAt(0).toUpperCase() + surface.key.slice(1);
      const half = side === 'middle' ? '' : side === 'both' ? ', both halves' : `, ${side} half`;
      const covers = lines
        .filter(({ surface: of, side: on }) => of === surface.key && (side === 'both' || on === side))
        .filter(({ line }) => {
          const kind = kinds.get(line);
          return stage === 'covered' || kind === undefined || !LATER[stage].has(kind);
        })
        .map(coverOf);
      return { code: `${surface.key} ${side} ${stage}`, label: `${name}${half}, ${stage}`, stage, covers };
    }),
  );
}

const folded = (text: string) => text.trim().toLowerCase().replace(/\s+/g, ' ');

/**
 * What somebody typed, picked or scanned; null where it means nothing or several things. A code, a whole name, and
 * the beginning of a single name all do.
 */
export function chosen(choices: readonly Choice[], typed: string): Choice | null {
  const text = folded(typed);
  if (text === '') return null;
  const whole = choices.find(({ code, label }) => folded(code) === text || folded(label) === text);
  if (whole) return whole;
  const words = text.split(' ');
  const near = choices.filter(({ label }) => words.every((word) => folded(label).includes(word)));
  return near.length === 1 ? (near[0] ?? null) : null;
}
