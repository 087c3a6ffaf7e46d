import type { Surface } from '#shared/core/plan.ts';
import { newPart, type NewPart, type PartChoice } from './new-part.ts';

/** Parts that are put in together, in sizes that suit the surface; from then on each is a part like any other. */
export type SetChoice = 'ribSet' | 'sparPair' | 'dBox' | 'stringerPair' | 'edges' | 'tip';

/** A part of a set, and what it is, for the material that it is made of. */
export interface SetPart {
  choice: PartChoice;
  part: NewPart;
}

/** The parts of a set on a surface. */
export function newSet(choice: SetChoice, surface: Surface): SetPart[] {
  switch (choice) {
    case 'ribSet':
      return [{ choice: 'ribs', part: ribSet(surface) }];
    case 'sparPair':
      return inTurn(surface, ['spar', 'spar']);
    case 'dBox':
      return inTurn(surface, ['sheeting', 'web'], (part) =>
        part.kind === 'web' ? { ...part, to: spanOf(surface) } : part,
      );
    case 'stringerPair':
      return stringerPair(surface);
    case 'edges':
      return inTurn(surface, ['leadingEdge', 'trailingEdge']);
    case 'tip':
      return inTurn(surface, ['tipBlock']);
  }
}

/** New parts one after the other, each knowing those before it: the second spar is the bottom one. */
function inTurn(
  surface: Surface,
  choices: readonly PartChoice[],
  mend: (part: NewPart) => NewPart = (part) => part,
): SetPart[] {
  const parts = [...surface.parts];
  return choices.map((choice) => {
    const part = mend(newPart(choice, { ...surface, parts }));
    parts.push({ ...part, id: `new ${parts.length}`, material: '' });
    return { choice, part };
  });
}

const spanOf = ({ panels }: Surface) => panels.reduce((sum, { span }) => sum + span, 0);

/** Bays of ribs, as a share of the chord; common practice, no source. */
const BAY = 0.4;
/** Stations are laid out to half millimetres. */
const halves = (value: number) => Math.round(value * 2) / 2;

/** Ribs in even bays within each panel, with one at the root, at every break and at the tip. */
function ribSet(surface: Surface): NewPart {
  const stations = [0];
  let start = 0;
  for (const { span, rootChord, tipChord } of surface.panels) {
    const bays = Math.max(1, Math.round(span / (BAY * ((rootChord + tipChord) / 2))));
    const end = start + span;
    for (let i = 1; i < bays; i++) stations.push(halves(start + (span * i) / bays));
    stations.push(end);
    start = end;
  }
  const {
    from: _from,
    to: _to,
    count: _count,
    ...ribs
  } = newPart('ribs', surface) as NewPart & { kind: 'ribs' };
  const root = surface.panels[0]?.rootChord ?? 100;
  return { ...ribs, stations, thickness: root < 130 ? 1.5 : root < 220 ? 2 : 3 };
}

/** A stringer on top and one below, behind the spars; before them where there are stringers already. */
function stringerPair(surface: Surface): SetPart[] {
  const isBehind = surface.parts.some(
    (part) => part.kind === 'strip' && part.group === 'stringers' && (part.at?.[0] ?? 0) > 0.4,
  );
  const at = isBehind ? 0.12 : 0.6;
  return (['top', 'bottom'] as const).map((seat) => {
    const part = newPart('stringer', surface) as NewPart & { kind: 'strip' };
    return { choice: 'stringer', part: { ...part, seat, name: `Stringer, ${seat}`, at: [at, at] } };
  });
}
