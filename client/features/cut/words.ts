import type { CutList, StickPiece } from '#shared/core/cut/cut-list.ts';
import { ribsAround, type Splice, type SpliceRefusal } from '#shared/core/cut/splice.ts';
import type { Plan } from '#shared/core/plan.ts';
import { ribNumbers } from '#shared/drawing/marks.ts';
import type { Units } from '#shared/format/units.ts';
import type { SheetPacking } from '#shared/core/cut/pack-sheets.ts';
import type { BlankRow, SheetGroup } from './sheet-groups.ts';
import type { StickGroup } from './stick-groups.ts';

const SIDES = { port: ', port', starboard: ', starboard', middle: '' } as const;

/** A stick as the builder calls it. */
export function stickName({ name, side, panel }: Pick<StickPiece, 'name' | 'side' | 'panel'>): string {
  return `${name}${SIDES[side]}${panel === null ? '' : `, panel ${panel}`}`;
}

const counted = (count: number, one: string, more = `${one}s`) => `${count} ${count === 1 ? one : more}`;

/** What the page comes to, before any list. */
export function cutHeadline(
  list: CutList,
  sticks: readonly StickGroup[],
  sheets: readonly SheetGroup[],
): { title: string; text: string } {
  const stickCount = sticks.reduce((sum, { needs }) => sum + needs.length, 0);
  const blankCount = sheets.reduce(
    (sum, { blanks }) => sum + blanks.reduce((count, { ids }) => count + ids.length, 0),
    0,
  );
  if (stickCount + blankCount === 0) {
    return { title: 'Nothing to cut', text: 'Ribs, spars, sheeting and edges of the drawing appear here.' };
  }
  const buy = (groups: readonly { packing: { bought: number } }[]) =>
    groups.reduce((sum, { packing }) => sum + packing.bought, 0);
  const [newSticks, newSheets] = [buy(sticks), buy(sheets)];
  const bought = [
    ...(newSticks > 0 ? [counted(newSticks, 'stick')] : []),
    ...(newSheets > 0 ? [counted(newSheets, 'sheet')] : []),
  ];
  const pieces = [
    ...sticks.flatMap(({ packing }) => packing.sticks),
    ...sheets.flatMap(({ packing }) => packing.sheets),
  ];
  const fromRack = pieces.filter(({ stock }) => stock !== null).length;
  const refused = sticks.flatMap(({ needs }) => needs.filter(({ splice }) => 'refused' in splice));
  const spliced = sticks.flatMap(({ needs }) =>
    needs.filter(({ splice }) => !('refused' in splice) && splice.joints.length > 0),
  );
  const cut = [
    ...(stickCount > 0 ? [counted(stickCount, 'stick')] : []),
    ...(blankCount > 0 ? [`${blankCount} pieces of sheet`] : []),
  ].join(' and ');
  const from = fromRack > 0 ? `, ${fromRack} from your rack` : '';
  const ribs = list.ribs.length > 0 ? [`${list.ribs.length} of the pieces are ribs`] : [];
  const parts = [
    ...ribs,
    spliced.length > 0 ? `${spliced.length} of the sticks spliced` : 'no stick needs a splice',
    ...(refused.length > 0 ? [`${refused.length} cannot be made from this stock`] : []),
  ];
  return {
    title: `${cut}; ${bought.length > 0 ? bought.join(' and ') : 'nothing'} to buy${from}`,
    text: `${parts.join('; ')}.`.replace(/^./, (letter) => letter.toUpperCase()),
  };
}

/** How well blanks lie on their sheets, told from the shop's side. */
export function packedWords({ bought, bound, sheets }: SheetPacking): string {
  if (sheets.length === 0) return 'On no sheet.';
  if (bought === 0) return 'All from what is at hand.';
  return `${bought} to buy${bought > bound ? `, at best ${bound}` : ''}; laid in strips along the grain.`;
}

/** Which cut of sheet the blanks want; nothing where any will do. */
export function grainWords(blanks: readonly BlankRow[]): string {
  const wants = (grain: BlankRow['grain']) => {
    const names = new Set(blanks.filter((blank) => blank.grain === grain).map(({ name }) => name));
    return [...names].join(', ');
  };
  const [bends, stiff] = [wants('bends'), wants('stiff')];
  return [
    ...(bends === '' ? [] : [`A or B grain, which bends across, for: ${bends}.`]),
    ...(stiff === '' ? [] : [`C or B grain, which is stiff across, for: ${stiff}.`]),
  ].join(' ');
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
