import { wingReference } from '#shared/core/wing-reference.ts';
import type { Panel, Surface } from '#shared/core/plan.ts';
import { glueByShare, sheetThickness, step } from './guided-wing.ts';
import type { GuidedWishes } from './guided-wishes.ts';
import type { Woodpile } from './materialize.ts';

/** Proportions of the tail; common practice, no source. */
const ARM_CHORDS = 4;
const TAIL_VOLUME = 0.6;
const TAIL_ASPECT = 5;
const FIN_VOLUME = 0.024;
const FIN_ASPECT = 1.3;

const whole = (value: number) => Math.max(1, Math.round(value));

/** Where things lie along the model, mm aft of the datum. */
export interface Lengths {
  /** foremost point, below 0 */
  nose: number;
  /** leading edge of the tailplane, and how long it is */
  tail: number;
  tailChord: number;
  /** where the model ends */
  end: number;
}

/** Tailplane and fin in size and place for the wing; none where none is wanted. */
export function guidedTail(
  wishes: GuidedWishes,
  wing: Surface,
  wood: Woodpile,
): { surfaces: Surface[]; lengths: Lengths } {
  const reference = wingReference({ surfaces: [wing] });
  const mac = reference?.mac ?? wishes.rootChord;
  const area = reference?.area ?? wishes.span * wishes.rootChord;
  const quarter = (reference?.xLeMac ?? 0) + mac / 4;
  const arm = ARM_CHORDS * mac;
  const tailArea = (TAIL_VOLUME * area * mac) / arm;
  const halfSpan = whole(Math.sqrt(TAIL_ASPECT * tailArea) / 2);
  const tailChord = whole(tailArea / (2 * halfSpan));
  const tail = whole(quarter + arm - tailChord / 4);
  const end = wishes.tail === 'none' ? whole(1.2 * mac) : tail + tailChord;
  const lengths = { nose: -whole(1.1 * mac), tail, tailChord, end };
  if (wishes.tail === 'none') return { surfaces: [], lengths };
  const thickness = sheetThickness(tailChord);
  const plate = { flat: thickness };
  const isBuilt = wishes.tail === 'built' && tailChord >= 60;
  const section = isBuilt ? { naca: '0008' } : plate;
  const panel = (span: number, chord: number, dihedral: number, spec: Panel['rootSection']): Panel => ({
    span,
    rootChord: chord,
    tipChord: whole(chord * 0.8),
    sweep: whole(chord * 0.1),
    dihedral,
    rootSection: spec,
    tipSection: spec,
  });
  const finArea = (FIN_VOLUME * area * wishes.span) / arm;
  const finChord = whole(Math.sqrt(finArea / FIN_ASPECT));
  const finThickness = sheetThickness(finChord);
  const tailplane: Surface = {
    key: 'tailplane',
    role: 'tailplane',
    apex: [tail, 0, 0],
    mirrored: true,
    panels: [panel(halfSpan, tailChord, 0, section)],
    parts: [],
  };
  const fin: Surface = {
    key: 'fin',
    role: 'fin',
    apex: [tail + tailChord - finChord, 0, 0],
    mirrored: false,
    panels: [panel(whole(finArea / finChord), finChord, 90, { flat: finThickness })],
    parts: [],
  };
  const plateOf = (surface: Surface, thick: number) =>
    wood.build(surface, [step('sheet'), step('glue')], (part) =>
      part.kind === 'sheet' ? { ...part, thickness: thick } : glueByShare(part),
    );
  return {
    surfaces: [
      isBuilt ? builtTail(tailplane, tailChord, wood) : plateOf(tailplane, thickness),
      plateOf(fin, finThickness),
    ],
    lengths,
  };
}

/** A light frame: edges, one spar on top and ribs, covered. */
function builtTail(surface: Surface, chord: number, wood: Woodpile): Surface {
  const steps = (['edges', 'spar', 'ribSet', 'covering', 'glue'] as const).map(step);
  const size = Math.max(1, Math.round(chord * 0.03 * 10) / 10);
  return wood.build(surface, steps, (part, choice) => {
    if (part.kind === 'ribs') return { ...part, thickness: 1 };
    if (part.kind !== 'strip') return part;
    if (choice === 'trailingEdge') return { ...part, height: [size * 0.5, size * 0.4] };
    const height = size * (choice === 'spar' ? 0.5 : 0.8);
    return { ...part, width: [size, size * 0.8], height: [height, height * 0.8] };
  });
}
