import { describe, expect, it } from 'vitest';
import { BLANK_PIECE, nextLike, pieceOf, type PieceDraft } from '#client/features/rack/draft.ts';
import {
  densityText,
  densityTicks,
  densityWhileTyping,
  rackHeadline,
} from '#client/features/rack/figures.ts';
import { columnText, previewHeadline } from '#client/features/rack/import-words.ts';
import { LABEL_SHEETS, LABELS_AT_ONCE, labelsText, pagesOf } from '#client/features/rack/label-sheets.ts';
import { orderedBy, paramsOf, viewOf } from '#client/features/rack/rack-view.ts';
import { planSplit } from '#client/features/rack/split-plan.ts';
import { sizeText } from '#client/features/rack/words.ts';
import { INCH_CHOICES, unitsOf, USUAL_UNITS } from '#shared/format/units.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';

const balsa = { key: 'balsa-medium', name: 'Balsa, medium', category: 'wood' } as const;
const spruce = { key: 'spruce', name: 'Spruce', category: 'wood' } as const;
const plain = (text: string) => text.replaceAll('\u202f', ' ');

const piece: StockPieceDto = {
  id: '7c1f4a54-6a0e-4c39-9a53-0d8f0a9f7a11',
  number: 3,
  kind: 'sheet',
  material: balsa,
  length: 1000,
  width: 100,
  thickness: 2,
  wall: null,
  mass: 28.4,
  resolution: null,
  grade: '',
  grainCut: null,
  note: '',
  state: 'free',
  weighed: true,
  density: 142,
  reservedFor: null,
  usedIn: null,
  parent: null,
  hasPhoto: false,
  version: 1,
  createdAt: '2026-03-01T10:00:00.000Z',
  updatedAt: '2026-03-01T10:00:00.000Z',
};
const sheet: PieceDraft = {
  ...BLANK_PIECE,
  material: balsa,
  length: 1000,
  width: 100,
  thickness: 2,
  mass: 28.4,
};
const tube: PieceDraft = { ...sheet, kind: 'tube', width: 6, thickness: null, wall: null, mass: 40 };

describe('the density of what is being typed', () => {
  it('is mass over volume, with the grade of balsa behind it', () => {
    const density = densityWhileTyping(sheet, 28.4);
    expect(density).toBeCloseTo(142, 9);
    expect(plain(densityText(balsa, density, USUAL_UNITS))).toBe('142 kg/m³, medium');
    expect(plain(densityText(spruce, density, USUAL_UNITS))).toBe('142 kg/m³');
  });

  it.each([
    ['no length', { ...sheet, length: null }, 28.4],
    ['a length that is no number', { ...sheet, length: NaN }, 28.4],
    ['no mass', sheet, null],
    ['a width of nothing', { ...sheet, width: 0 }, 28.4],
    ['a wall wider than the tube', { ...tube, wall: 4 }, 40],
  ])('is not told with %s', (_, draft, mass) => expect(densityWhileTyping(draft, mass)).toBeNull());

  it('counts a tube without a wall as a solid rod', () => {
    expect(densityWhileTyping(tube, 40)).toBeCloseTo(40e6 / (Math.PI * 9 * 1000), 6);
  });
});

describe('a form', () => {
  it('becomes a piece, and a rod as thick as wide', () => {
    expect(pieceOf(sheet)).toMatchObject({ input: { length: 1000, wall: null, mass: 28.4 } });
    expect(pieceOf(tube)).toMatchObject({ input: { width: 6, thickness: 6, wall: 3 } });
  });

  it('says at each field what is missing or no number', () => {
    expect(pieceOf({ ...sheet, material: null, length: null, mass: NaN })).toEqual({
      errors: {
        material: 'Choose a material.',
        length: 'Type a number.',
        mass: 'Not a number. Write 12.5, 1/16 or 3 1/2 in.',
      },
    });
  });

  it('keeps the sizes for the next piece and asks for its mass', () => {
    expect(nextLike({ ...sheet, note: 'knot' })).toEqual({ ...sheet, mass: null });
  });
});

describe('the headline', () => {
  it('tells count, mass and the lightest sheet', () => {
    const stick = { ...piece, kind: 'stick', density: 60, mass: 1 } as const;
    const text = plain(rackHeadline([piece, { ...piece, density: 78, mass: 10 }, stick], false, USUAL_UNITS));
    expect(text).toBe(`3 pieces, ${plain(USUAL_UNITS.format(39.4, 'mass'))}; lightest sheet 78 kg/m³`);
  });

  it('tells what was not weighed, and that there is more', () => {
    expect(plain(rackHeadline([{ ...piece, mass: null, density: null }], true, USUAL_UNITS))).toBe(
      '1 piece so far; 1 without a mass',
    );
  });

  it('tells what of a file can be taken in', () => {
    const row = { line: 2, piece: pieceOf(sheet) as never, doubt: null };
    const bad = { line: 4, text: '', problems: [] };
    expect(previewHeadline({ rows: [row, { ...row, doubt: 'heavy' }], bad: [bad] })).toBe(
      '2 pieces can be taken in; 1 line cannot; 1 should be looked at.',
    );
    expect(previewHeadline({ rows: [], bad: [bad, bad] })).toBe('No line can be taken in; 2 lines cannot.');
  });
});

describe('the columns of a file', () => {
  it('are told with what they are read as', () => {
    expect(columnText({ header: 'len (in)', field: 'length', unit: 'in' })).toBe('“len (in)” → length, in');
    expect(columnText({ header: 'Cut', field: 'grainCut', unit: null })).toBe('“Cut” → grain cut');
    expect(columnText({ header: 'Shop', field: null, unit: null })).toBe('“Shop” is left out');
  });
});

describe('the scale of the plot', () => {
  it('has round figures and ends past the largest, whatever the unit', () => {
    expect(densityTicks(181, USUAL_UNITS)).toEqual([0, 50, 100, 150, 200]);
    const pounds = densityTicks(181, unitsOf(INCH_CHOICES));
    expect(pounds.at(-1)).toBeGreaterThanOrEqual(181);
    expect(pounds.map((one) => Math.round(one / 16.018463))).toEqual([0, 5, 10, 15]);
    expect(densityTicks(181, unitsOf({ density: 'g/cm3' })).map((one) => Math.round(one))).toEqual([
      0, 50, 100, 150, 200,
    ]);
  });
});

describe('sizes', () => {
  it('are told in the reader’s unit, in inches as fractions', () => {
    expect(plain(sizeText(piece, USUAL_UNITS))).toBe('1 000 × 100 × 2 mm');
    const inches = { ...piece, length: 914.4, width: 76.2, thickness: 1.5875 };
    expect(plain(sizeText(inches, unitsOf(INCH_CHOICES)))).toBe('36 × 3 × 1/16 in');
    expect(plain(sizeText({ ...piece, kind: 'tube', width: 6, wall: 1 }, USUAL_UNITS))).toBe(
      '⌀ 6 × 1 000 mm, wall 1 mm',
    );
  });
});

describe('a split', () => {
  it('shows the rest behind the cuts, and shares the mass by volume', () => {
    const plan = planSplit(piece, { along: 'length', wanted: [300, 300], kerf: 1 });
    expect(plan).toEqual({
      pieces: [
        { measure: 300, mass: 8.52, rest: false },
        { measure: 300, mass: 8.52, rest: false },
        { measure: 398, mass: 11.3032, rest: true },
      ],
      lost: 0.0568,
    });
  });

  it('says by how much the piece is too short', () => {
    expect(planSplit(piece, { along: 'width', wanted: [60, 60], kerf: 1 })).toEqual({ missing: 21 });
  });

  it('waits for what is still to be typed', () => {
    expect(planSplit(piece, { along: 'length', wanted: [], kerf: 0 })).toBeNull();
    expect(planSplit(piece, { along: 'length', wanted: [10], kerf: NaN })).toBeNull();
  });
});

describe('the view', () => {
  it('comes back from its address, and holds against a bad one', () => {
    const view = {
      search: 'knot',
      state: 'used',
      kind: 'tube',
      order: 'density',
      direction: 'desc',
    } as const;
    expect(viewOf(paramsOf(view))).toEqual(view);
    const usual = viewOf(new URLSearchParams('state=lost&order=colour&kind=plank&direction=up'));
    expect(usual).toEqual({ search: '', state: 'onRack', kind: null, order: 'number', direction: 'asc' });
    expect(paramsOf(usual).toString()).toBe('');
    expect(orderedBy(orderedBy(usual, 'mass'), 'mass')).toMatchObject({ order: 'mass', direction: 'desc' });
  });
});

describe('label sheets', () => {
  it('fill one page after another', () => {
    const labels = Array.from({ length: 25 }, (_, i) => i);
    expect(pagesOf(labels, LABEL_SHEETS[0]).map((page) => page.length)).toEqual([24, 1]);
    expect(pagesOf([], LABEL_SHEETS[0])).toEqual([]);
  });

  it('are asked for no more at once than an address holds', () => {
    expect(labelsText(0, 50)).toBe('Labels');
    expect(labelsText(2, 2)).toBe('Labels of 2');
    expect(labelsText(0, LABELS_AT_ONCE + 1)).toBe('Labels of the first 96');
  });
});
