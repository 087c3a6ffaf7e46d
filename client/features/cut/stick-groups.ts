import type { StickPiece } from '#shared/core/cut/cut-list.ts';
import { WIDEST_STICK } from '#shared/core/cut/cut-parts.ts';
import { packSticks, type StickPacking, type StickStock } from '#shared/core/cut/pack-sticks.ts';
import { spliceOf, type Splice, type SpliceRefusal } from '#shared/core/cut/splice.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import type { CutTerms } from './cut-terms.ts';

/** A stick with how it is spliced, where it has to be. */
export interface CutStickNeed {
  piece: StickPiece;
  splice: Splice | SpliceRefusal;
}

/** Sticks of one part that are alike, port and starboard together. */
export interface StickRow {
  ids: string[];
  piece: StickPiece;
  splice: Splice | SpliceRefusal;
  /** of both halves, so that the side is not named */
  isOfBoth: boolean;
}

/** Lengths this near are one length, mm: no saw tells them apart. */
const SAME_LENGTH = 0.05;

/** Sticks as they are listed: those of one part, length and splice in one row. */
export function stickRows(needs: readonly CutStickNeed[]): StickRow[] {
  const rows: (StickRow & { joints: string; sides: Set<string> })[] = [];
  for (const { piece, splice } of needs) {
    const joints = JSON.stringify(splice);
    const alike = rows.find((row) => {
      const { line, panel, length } = row.piece;
      const isPart = line === piece.line && panel === piece.panel && joints === row.joints;
      return isPart && Math.abs(length - piece.length) < SAME_LENGTH;
    });
    if (alike) {
      alike.ids.push(piece.id);
      alike.sides.add(piece.side);
    } else
      rows.push({ ids: [piece.id], piece, splice, isOfBoth: false, joints, sides: new Set([piece.side]) });
  }
  return rows.map(({ ids, piece, splice, sides }) => ({ ids, piece, splice, isOfBoth: sides.size > 1 }));
}

/** Sticks of one material and section, and how they are cut from stock. */
export interface StickGroup {
  key: string;
  material: string;
  width: number;
  thickness: number;
  needs: CutStickNeed[];
  packing: StickPacking;
}

/** Sticks that are spliced alike take turns, so that no two joints lie at one station. */
const TURNS = [0, 1, 2, 3] as const;

/** Sections this near are one size of stock, mm. */
const ALIKE = 0.15;

/** Sticks of the rack that a group can be cut from. */
function atHandFor(
  group: Pick<StickGroup, 'material' | 'width' | 'thickness'>,
  rack: readonly StockPieceDto[],
): StickStock[] {
  const near = (a: number, b: number) => Math.abs(a - b) <= ALIKE;
  return rack
    .filter(({ kind, material, width, thickness, state }) => {
      const [large, small] = [Math.max(width, thickness), Math.min(width, thickness)];
      const fits = near(large, group.width) && near(small, group.thickness);
      return kind === 'stick' && state === 'free' && material.key === group.material && fits;
    })
    .map(({ number, length }) => ({ id: `No. ${number}`, length, count: 1 }));
}

/** The sticks of a cut list by material and section, spliced where they are longer than any stock, and packed. */
export function stickGroups(
  sticks: readonly StickPiece[],
  terms: CutTerms,
  rack: readonly StockPieceDto[],
): StickGroup[] {
  const byKey = new Map<string, StickPiece[]>();
  for (const piece of sticks) {
    if (piece.width > WIDEST_STICK) continue;
    const key = `${piece.material} ${piece.width.toFixed(2)} × ${piece.thickness.toFixed(2)}`;
    byKey.set(key, [...(byKey.get(key) ?? []), piece]);
  }
  return [...byKey].map(([key, pieces]): StickGroup => {
    const { material = '', width = 0, thickness = 0 } = pieces[0] ?? {};
    const atHand = atHandFor({ material, width, thickness }, rack);
    const stock = Math.max(terms.bought, ...atHand.map(({ length }) => length));
    let turn = 0;
    const needs = pieces.map((piece): CutStickNeed => {
      const { length, place } = piece;
      const stick = { length, thickness, from: place?.from ?? 0, halfSpan: place?.halfSpan ?? 0 };
      if (length <= stock) return { piece, splice: spliceOf(stick, { stock, slope: terms.slope, turn: 0 }) };
      const turned = TURNS[turn++ % TURNS.length] ?? 0;
      return { piece, splice: spliceOf(stick, { stock, slope: terms.slope, turn: turned }) };
    });
    const wanted = needs.flatMap(({ piece, splice }) =>
      'refused' in splice
        ? [{ id: piece.id, length: piece.length }]
        : splice.pieces.map((length, i) => ({
            id: splice.pieces.length > 1 ? `${piece.id}, part ${i + 1}` : piece.id,
            length,
          })),
    );
    const { bought, kerf, shortestOffcut } = terms;
    return {
      key,
      material,
      width,
      thickness,
      needs,
      packing: packSticks(wanted, { atHand, bought, kerf, shortestOffcut }),
    };
  });
}
