import type { CutList, StickPiece } from '#shared/core/cut/cut-list.ts';
import { ribsAround, type Splice, type SpliceRefusal } from '#shared/core/cut/splice.ts';
import type { Plan } from '#shared/core/plan.ts';
import { ribNumbers } from '#shared/drawing/marks.ts';
import type { Units } from '#shared/format/units.ts';
import type { StickGroup } from './stick-groups.ts';

const SIDES = { port: ', port', starboard: ', starboard', middle: '' } as const;

/** A stick as the builder calls it. */
export function stickName({ name, side, panel }: Pick<StickPiece, 'name' | 'side' | 'panel'>): string {
  return `${name}${SIDES[side]}${panel === null ? '' : `, panel ${panel}`}`;
}

/** What the page comes to, before any list. */
export function cutHeadline(list: CutList, groups: readonly StickGroup[]): { title: string; text: string } {
  const buy = groups.reduce((sum, { packing }) => sum + packing.bought, 0);
  const used = groups.reduce(
    (sum, { packing }) => sum + packing.sticks.filter(({ stock }) => stock !== null).length,
    0,
  );
  const refused = groups.flatMap(({ needs }) => needs.filter(({ splice }) => 'refused' in splice));
  const spliced = groups.flatMap(({ needs }) =>
    needs.filter(({ splice }) => !('refused' in splice) && splice.joints.length > 0),
  );
  const sticks = groups.reduce((sum, { needs }) => sum + needs.length, 0);
  if (list.sticks.length === 0) {
    return { title: 'No sticks to cut', text: 'Spars, stringers and edges of the drawing appear here.' };
  }
  const ribs = list.ribs.length === 0 ? '' : ` and ${list.ribs.length} ribs`;
  const from = used > 0 ? `, ${used} from your rack` : '';
  const parts = [
    spliced.length > 0 ? `${spliced.length} of them spliced` : 'none needs a splice',
    ...(refused.length > 0 ? [`${refused.length} cannot be made from this stock`] : []),
  ];
  return {
    title: `${sticks} sticks${ribs}; ${buy} ${buy === 1 ? 'stick' : 'sticks'} to buy${from}`,
    text: `${parts.join('; ')}.`.replace(/^./, (letter) => letter.toUpperCase()),
  };
}

/** Where a stick is joined, told by mm and by the ribs about it; or why it cannot be. */
export function spliceWords(
  plan: Plan,
  piece: StickPiece,
  splice: Splice | SpliceRefusal,
  units: Units,
): string | null {
  const length = (mm: number) => units.format(mm, 'length');
  if ('refused' in splice) {
    return splice.refused === 'joint_in_inner_third'
      ? `Its joint would lie in the inner third of the half span, where none may be: stock has to be ${length(splice.by)} longer.`
      : `Stock is ${length(splice.by)} shorter than the scarf itself.`;
  }
  if (splice.joints.length === 0) return null;
  const surface = plan.surfaces.find(({ key }) => key === piece.place?.surface);
  const ribs = surface ? ribNumbers(surface) : [];
  const joints = splice.joints.map((joint) => {
    const s = (piece.place?.from ?? 0) + joint;
    const [inner, outer] = ribsAround(ribs, s);
    const about =
      inner !== null && outer !== null
        ? inner === outer
          ? `, at rib ${inner}`
          : `, between ribs ${inner} and ${outer}`
        : '';
    return `${length(s)} from the root${about}`;
  });
  return `Scarf of ${length(splice.scarf)}, its middle ${joints.join(' and ')}.`;
}
