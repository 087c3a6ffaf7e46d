import { describe, expect, it } from 'vitest';
import { sidedLines } from '#shared/core/built/sided-lines.ts';
import { cutParts } from '#shared/core/cut/cut-parts.ts';
import { sheetBlanks } from '#shared/core/cut/sheet-blanks.ts';
import { METRIC_SIZES, sheetSold, stickSold } from '#shared/core/cut/shop-sizes.ts';
import { nearestMiss } from '#shared/core/cut/stock-fit.ts';
import { EXAMPLE_ASSIGNMENT, EXAMPLE_PLAN, EXAMPLE_WEB } from '#shared/core/example-wing.ts';
import { demoPlan, planOf, wingOf } from '#tests/support/plans.ts';

const DEMOS = ['dunlin', 'plover', 'whimbrel'] as const;

describe('the pieces that a plan is cut as', () => {
  it.each(DEMOS)('of %s weigh together what its wood of sheet and stick weighs', (name) => {
    const plan = demoPlan(name);
    const parts = cutParts(plan);
    const cut = new Set(parts.map(({ line }) => line));
    const wood = sidedLines(plan).filter(({ line }) => cut.has(line));
    const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);
    const pieces = sum(parts.map(({ volume, density }) => volume * density * 1e-6));
    expect(pieces).toBeCloseTo(sum(wood.map(({ mass }) => mass)), 9);
    expect(new Set(parts.map(({ id }) => id)).size).toBe(parts.length);
  });

  it.each(DEMOS)('of %s take every wooden line but blocks', (name) => {
    const plan = demoPlan(name);
    const cut = new Set(cutParts(plan).map(({ line }) => line));
    const missing = sidedLines(plan).filter(({ line, material, mass }) => {
      const isWood = plan.materials[material ?? '']?.category === 'wood';
      return isWood && mass > 0 && !cut.has(line);
    });
    const blocks = plan.surfaces.flatMap(({ key, parts }) =>
      parts.filter(({ kind }) => kind === 'tipBlock').map(({ id }) => `${key}/${id}`),
    );
    expect(new Set(missing.map(({ line }) => line))).toEqual(
      new Set(blocks.filter((id) => missing.some(({ line }) => line === id))),
    );
  });

  it('of one half lie as far out as those of the other', () => {
    const parts = cutParts(demoPlan('dunlin')).filter(({ surface }) => surface === 'wing');
    const of = (side: string) =>
      parts.filter((part) => part.side === side).map(({ line, number, y }) => [line, number, y]);
    expect(of('port')).toEqual(of('starboard'));
    expect(of('port').length).toBeGreaterThan(10);
  });
});

describe('blanks of sheet', () => {
  it('of a web are one for each bay, grain upright, narrower by the ribs', () => {
    const [wing] = EXAMPLE_PLAN.surfaces;
    if (!wing) throw new Error('no wing');
    const plan = { ...EXAMPLE_PLAN, surfaces: [{ ...wing, parts: [...wing.parts, EXAMPLE_WEB] }] };
    const webs = sheetBlanks(plan).filter(({ line, side }) => line === 'wing/web' && side === 'port');
    // Six ribs of 2 mm, 100 mm apart.
    expect(webs.map(({ width }) => width)).toEqual([98, 98, 98, 98, 98]);
    expect(webs.every(({ length }) => Math.abs(length - 7) < 0.5)).toBe(true);
  });

  it('wider than any sheet are joined from strips of equal width', () => {
    const plate = {
      id: 'fin',
      name: 'Fin',
      kind: 'sheet',
      material: 'balsa',
      thickness: 3,
      cutout: 0,
    } as const;
    const blanks = sheetBlanks(planOf([wingOf([plate])]));
    const widths = blanks.filter(({ side }) => side === 'port').map(({ width }) => width);
    const chord = Math.max(
      ...planOf([wingOf([plate])]).surfaces[0]!.panels.map(({ rootChord }) => rootChord),
    );
    expect(widths).toHaveLength(Math.ceil(chord / 101.6));
    expect(widths[0]! * widths.length).toBeCloseTo(chord, 6);
  });
});

describe('what shops sell', () => {
  it.each([
    [1.6, null, [1.5]],
    [1.7, null, [2]],
    [1, null, [1]],
    [12, null, [null]],
    [5, 3, [5, 3]],
    [6.5, 2.2, [8, 3]],
    [20, 3, [null]],
  ])('for %s × %s mm', (width, thickness, sold) => {
    const found =
      thickness === null ? [sheetSold(width, METRIC_SIZES)] : stickSold(width, thickness, METRIC_SIZES);
    expect(found ?? [null]).toEqual(sold);
  });
});

describe('a part that no piece will do for', () => {
  it('is told by the nearest miss, and by how much', () => {
    const [part] = EXAMPLE_ASSIGNMENT.parts;
    const [sheet] = EXAMPLE_ASSIGNMENT.stock;
    if (!part || !sheet) throw new Error('no example');
    const miss = (...changes: object[]) =>
      nearestMiss(
        part,
        changes.map((change) => ({ ...sheet, ...change })),
      );
    expect(miss({ length: 60 }, { length: 90 }, { form: 'stick' })).toEqual({ code: 'too_short', by: 10 });
    expect(miss({ length: 60 }, { width: 8 })).toEqual({ code: 'too_narrow', by: 2 });
    expect(miss({ wood: 'spruce' }, { grainCut: 'A' })).toEqual({ code: 'other_grain' });
    expect(miss({ thickness: 3 })).toEqual({ code: 'other_thickness', by: 1 });
    expect(miss()).toEqual({ code: 'other_form' });
    expect(miss({ length: 60 }, {})).toBeNull();
  });
});
