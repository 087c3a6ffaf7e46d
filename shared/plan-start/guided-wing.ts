import { cosDegrees } from '#shared/core/frame.ts';
import type { Panel, SectionSpec, Surface } from '#shared/core/plan.ts';
import type { GuidedWishes } from './guided-wishes.ts';
import type { Woodpile } from './materialize.ts';
import { newPart, type NewPart, type PartChoice } from './new-part.ts';
import { newSet, type SetChoice, type SetPart } from './part-sets.ts';

/** Angles and breaks of the dihedral; common practice, no source. */
const VEE = 5;
const POLYHEDRAL = { inner: 3, outer: 13, breakAt: 0.6 };
/** Share of the chord along which the wing's straight line runs: the spar's. */
const STRAIGHT = 0.3;

const tenths = (value: number) => Math.max(0.1, Math.round(value * 10) / 10);

/** Thickness of a sheet wing of that chord, mm: about 3 %, as balsa is sold. */
export function sheetThickness(chord: number): number {
  const sold = [1, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10, 12];
  return sold.findLast((thickness) => thickness <= chord * 0.032) ?? 1;
}

/** Length of the tip blocks, mm; none on a sheet wing. */
export function tipLength({ structure, tipChord }: GuidedWishes): number {
  return structure === 'sheet' ? 0 : Math.max(5, Math.round(tipChord * 0.2));
}

/** Panels of one half, root to tip: together with the tip's block half the span, projected. */
export function wingPanels(wishes: GuidedWishes): Panel[] {
  const { span, rootChord, tipChord, dihedral, structure, section } = wishes;
  const angles =
    dihedral === 'flat' ? [0] : dihedral === 'vee' ? [VEE] : [POLYHEDRAL.inner, POLYHEDRAL.outer];
  const last = angles.at(-1) ?? 0;
  const half = span / 2 - tipLength(wishes) * cosDegrees(last);
  const inner = POLYHEDRAL.breakAt * half;
  const projected = angles.length === 1 ? [half] : [inner, half - inner];
  const spec: SectionSpec = structure === 'sheet' ? { flat: sheetThickness(rootChord) } : { naca: section };
  let from = 0;
  return angles.map((angle, i) => {
    const to = from + (projected[i] ?? 0);
    const chordAt = (y: number) => rootChord + ((tipChord - rootChord) * y) / half;
    const [root, tip] = [chordAt(from), i === angles.length - 1 ? tipChord : chordAt(to)];
    const panel = {
      span: (projected[i] ?? 0) / cosDegrees(angle),
      rootChord: root,
      tipChord: tip,
      sweep: STRAIGHT * (root - tip),
      dihedral: angle,
      rootSection: spec,
      tipSection: spec,
    };
    from = to;
    return panel;
  });
}

const SETS: Record<'sheeted' | 'open', readonly (SetChoice | PartChoice)[]> = {
  sheeted: ['edges', 'sparPair', 'ribSet', 'dBox', 'capStrips', 'tip', 'covering', 'glue'],
  open: ['edges', 'sparPair', 'stringerPair', 'ribSet', 'tip', 'covering', 'glue'],
};
const SET_NAMES: ReadonlySet<string> = new Set([
  'ribSet',
  'sparPair',
  'dBox',
  'stringerPair',
  'edges',
  'tip',
]);
const isSet = (choice: SetChoice | PartChoice): choice is SetChoice => SET_NAMES.has(choice);

/** One part, or a set of them, as a step of building. */
export const step =
  (choice: SetChoice | PartChoice) =>
  (surface: Surface): readonly SetPart[] =>
    isSet(choice) ? newSet(choice, surface) : [{ choice, part: newPart(choice, surface) }];

/** The wing with everything that it is built of. */
export function guidedWing(wishes: GuidedWishes, wood: Woodpile): Surface {
  const bare: Surface = {
    key: 'wing',
    role: 'wing',
    apex: [0, 0, 0],
    mirrored: true,
    panels: wingPanels(wishes),
    parts: [],
  };
  if (wishes.structure === 'sheet') {
    const thickness = sheetThickness(wishes.rootChord);
    return wood.build(bare, [step('sheet'), step('finish'), step('glue')], (part) =>
      part.kind === 'sheet' ? { ...part, thickness } : glueByShare(part),
    );
  }
  const percent = Number(wishes.section.slice(2)) / 100;
  const thin = percent * wishes.tipChord;
  return wood.build(bare, SETS[wishes.structure].map(step), (part, choice) =>
    slim(part, choice, { thin, percent, wishes }),
  );
}

/** Of a sheet wing little glue is joints that could be measured: two in a hundred of its wood, common practice. */
export function glueByShare(part: NewPart): NewPart {
  return part.kind === 'glue'
    ? { kind: 'glue', name: 'Glue', group: 'glue', method: 'share', share: 0.02 }
    : part;
}

interface Slimming {
  /** thickness of the section at the tip, mm */
  thin: number;
  /** thickness over chord */
  percent: number;
  wishes: GuidedWishes;
}

/** Sizes that fit into a thin section as well. */
function slim(part: NewPart, choice: PartChoice, { thin, percent, wishes }: Slimming): NewPart {
  const { rootChord, tipChord } = wishes;
  if (part.kind === 'tipBlock') return { ...part, length: tipLength(wishes) };
  if (part.kind === 'skin' || part.kind === 'capStrips') return { ...part, thickness: thin < 8 ? 0.8 : 1 };
  if (part.kind !== 'strip') return part;
  if (choice === 'spar') {
    const height = (chord: number) => tenths(Math.min(0.02 * chord, 0.2 * percent * chord));
    return { ...part, height: [height(rootChord), height(tipChord)] };
  }
  if (choice === 'stringer') {
    const size = tenths(Math.min(1.6, 0.12 * thin));
    return { ...part, width: [size, size], height: [size, size] };
  }
  if (choice === 'leadingEdge') {
    const size = (chord: number) => tenths(Math.min(0.035, 0.3 * percent) * chord);
    return { ...part, width: [size(rootChord), size(tipChord)], height: [size(rootChord), size(tipChord)] };
  }
  const height = (chord: number) => tenths(Math.min(0.02, 0.15 * percent) * chord);
  return { ...part, height: [height(rootChord), height(tipChord)] };
}
