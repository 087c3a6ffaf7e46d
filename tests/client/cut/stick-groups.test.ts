import { describe, expect, it } from 'vitest';
import { USUAL_TERMS } from '#client/features/cut/cut-terms.ts';
import { sheetGroups } from '#client/features/cut/sheet-groups.ts';
import { stickGroups } from '#client/features/cut/stick-groups.ts';
import { cutHeadline, spliceWords, stickName } from '#client/features/cut/words.ts';
import { cutList } from '#shared/core/cut/cut-list.ts';
import { METRIC_SIZES } from '#shared/core/cut/shop-sizes.ts';
import { unitsOf } from '#shared/format/units.ts';
import { demoPlan } from '#tests/support/plans.ts';

const plan = demoPlan('dunlin');
const list = cutList(plan);

describe('the sticks of a plan', () => {
  it('are gathered by wood and section, every one of them cut from something', () => {
    const groups = stickGroups(list.sticks, USUAL_TERMS, []);
    const cut = groups.flatMap(({ packing }) =>
      packing.sticks.flatMap(({ cuts }) => cuts.map(({ id }) => id)),
    );
    const needed = groups.flatMap(({ needs }) => needs.map(({ piece }) => piece.id));
    expect(cut.toSorted()).toEqual(needed.toSorted());
    expect(groups.every(({ width }) => width <= 13)).toBe(true);
    const sheets = sheetGroups(plan, USUAL_TERMS, { rack: [], sizes: METRIC_SIZES });
    const { title, text } = cutHeadline(list, groups, sheets);
    expect(title).toMatch(/^\d+ sticks and \d+ pieces of sheet; \d+ sticks and \d+ sheets to buy$/);
    expect(text).toMatch(/^38 of the pieces are ribs; /);
  });

  it('say where they are spliced when stock is short, and by how much when it is too short', () => {
    const spliced = stickGroups(list.sticks, { ...USUAL_TERMS, bought: 330 }, []).flatMap(
      ({ needs }) => needs,
    );
    const spar = spliced.find(({ piece }) => stickName(piece) === 'Spar, top, port, panel 1');
    if (!spar) throw new Error('no spar');
    // 370 mm from stock of 330 mm: a scarf of 8 × 3 mm, its middle 12 mm inside the end of the stock.
    expect(spliceWords(plan, spar.piece, spar.splice, unitsOf({}))?.replaceAll('\u202f', ' ')).toMatch(
      /^Scarf of 24\.0 mm, its middle \d+\.\d mm from the root, between ribs \d and \d\.$/,
    );
    const short = stickGroups(list.sticks, { ...USUAL_TERMS, bought: 150 }, []).flatMap(({ needs }) => needs);
    const refused = short.find(({ piece }) => piece.id === spar.piece.id);
    expect(spliceWords(plan, spar.piece, refused?.splice ?? spar.splice, unitsOf({}))).toContain(
      'inner third',
    );
  });
});
