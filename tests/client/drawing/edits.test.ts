import { describe, expect, it } from 'vitest';
import { existingTab, placeOfLine } from '#client/features/drawing/edits/line-id.ts';
import {
  changePanel,
  changeParts,
  dropUnused,
  inTurn,
  keepMaterial,
  nextPanel,
} from '#client/features/drawing/edits/plan-edits.ts';
import { copiedRow, movedRow, withoutRow } from '#client/features/drawing/edits/rows.ts';
import { freshId, freshName } from '#shared/plan-start/names.ts';
import type { Panel } from '#shared/core/plan.ts';
import { demoPlan, MATERIALS, planOf, wingOf } from '#tests/support/plans.ts';

const rows = ['a', 'b', 'c'].map((id) => ({ id, name: id.toUpperCase() }));
const ids = (list: readonly { id: string }[]) => list.map(({ id }) => id).join('');

describe('rows', () => {
  it('move by a step and stay where they are at the ends', () => {
    expect(ids(movedRow(rows, 'b', -1))).toBe('bac');
    expect(ids(movedRow(rows, 'b', 1))).toBe('acb');
    expect(ids(movedRow(rows, 'a', -1))).toBe('abc');
    expect(ids(movedRow(rows, 'c', 1))).toBe('abc');
  });

  it('are copied after the original, under an id and a name that nobody has', () => {
    const once = copiedRow(rows, 'a').rows;
    const twice = copiedRow(once, 'a').rows;
    expect(twice.map(({ id, name }) => `${id} ${name}`)).toEqual(['a A', 'a-3 A 3', 'a-2 A 2', 'b B', 'c C']);
    expect(copiedRow(rows, 'x')).toEqual({ rows, copy: null });
  });

  it('are removed by their id only', () => {
    expect(ids(withoutRow(rows, 'b'))).toBe('ac');
  });

  it('number a taken id on, not its copies’ numbers', () => {
    expect(freshId('rib-2', ['rib', 'rib-2'])).toBe('rib-3');
    expect(freshName('Ribs 2', ['Ribs', 'Ribs 2'])).toBe('Ribs 3');
    expect(freshId('spar', [])).toBe('spar');
  });
});

describe('panels', () => {
  const panel: Panel = {
    span: 300,
    rootChord: 150,
    tipChord: 120,
    sweep: 10,
    dihedral: 0,
    rootSection: { naca: '4409' },
    tipSection: { naca: '4409' },
  };
  const outer: Panel = { ...panel, rootChord: 120, tipChord: 80, tipSection: { naca: '2408' } };

  it('stay joined: a changed tip chord takes the next root chord with it, and the other way round', () => {
    const [a, b] = changePanel([panel, outer], 0, { tipChord: 111 });
    expect([a?.tipChord, b?.rootChord]).toEqual([111, 111]);
    const [c, d] = changePanel([panel, outer], 1, { rootChord: 99 });
    expect([c?.tipChord, d?.rootChord]).toEqual([99, 99]);
  });

  it('keep a step that is there already', () => {
    const [a, b] = changePanel([panel, { ...outer, rootChord: 130 }], 0, { tipChord: 111 });
    expect([a?.tipChord, b?.rootChord]).toEqual([111, 130]);
  });

  it('share the section in which they meet', () => {
    const [a, b] = changePanel([panel, outer], 0, { tipSection: { naca: '6409' } });
    expect([a?.tipSection, b?.rootSection]).toEqual([{ naca: '6409' }, { naca: '6409' }]);
    expect(b?.tipSection).toEqual({ naca: '2408' });
  });

  it('go on from the last one', () => {
    expect(nextPanel(outer)).toMatchObject({ rootChord: 80, rootSection: { naca: '2408' } });
  });
});

describe('recipes', () => {
  const plan = planOf([
    wingOf([{ id: 'sheet', name: 'Sheet', kind: 'sheet', material: 'balsa', thickness: 3, cutout: 0 }]),
  ]);

  it('leave the plan they are given as it is, and share what they did not touch', () => {
    const before = JSON.stringify(plan);
    const after = changeParts(0, () => [])(plan);
    expect(after.surfaces[0]?.parts).toEqual([]);
    expect(after.surfaces[0]?.panels).toBe(plan.surfaces[0]?.panels);
    expect(JSON.stringify(plan)).toBe(before);
  });

  it('copy a material’s figures into the plan, once', () => {
    const spruce = { name: 'Spruce', category: 'wood', density: 448, cv: 0.1 } as const;
    const after = keepMaterial('spruce', spruce)(plan);
    expect(after.materials['spruce']).toEqual(spruce);
    expect(keepMaterial('spruce', { ...spruce, density: 1 })(after)).toBe(after);
  });

  it('drop a material that nothing uses, but only one that the table could give back', () => {
    const table = (key: string) => key !== 'own';
    const unused = planOf(plan.surfaces, { materials: { ...MATERIALS, own: MATERIALS['hard']! } });
    expect(Object.keys(dropUnused('hard', table)(unused).materials)).not.toContain('hard');
    expect(dropUnused('own', table)(unused)).toBe(unused);
    expect(dropUnused('balsa', table)(unused)).toBe(unused);
  });

  it('act in turn as one', () => {
    const name = (to: string) => (p: typeof plan) => ({ ...p, name: p.name + to });
    expect(inTurn(name('1'), name('2'))(plan).name).toBe('Test12');
  });
});

describe('places of lines', () => {
  const plan = demoPlan('dunlin');

  it('are found among surfaces, solids and items', () => {
    expect(placeOfLine(plan, 'fin/fin')).toEqual({ tab: { kind: 'surface', index: 2 }, id: 'fin' });
    expect(placeOfLine(plan, 'solid/boom')).toEqual({ tab: { kind: 'solids' }, id: 'boom' });
    expect(placeOfLine(plan, 'item/timer')).toEqual({ tab: { kind: 'items' }, id: 'timer' });
    expect(placeOfLine(plan, 'wing/gone')).toBeNull();
    expect(placeOfLine(plan, null)).toBeNull();
  });

  it('fall back to what is left when a surface is removed', () => {
    expect(existingTab(plan, { kind: 'surface', index: 7 })).toEqual({ kind: 'surface', index: 2 });
    expect(existingTab({ ...plan, surfaces: [] }, { kind: 'surface', index: 0 })).toEqual({ kind: 'solids' });
  });
});
