import { describe, expect, it } from 'vitest';
import { groupSaves } from '#client/features/log/saves/save-groups.ts';
import type { GliderSaveDto } from '#shared/schemas/glider-save.ts';
import { saveAt } from './saves.ts';

const grouped = (saves: GliderSaveDto[]) =>
  groupSaves(saves).map((group) => group.saves.map(({ version }) => version));

describe('rows of the log', () => {
  it('hold the quick saves of one person together, and what they came to', () => {
    const [evening] = groupSaves([saveAt(4), saveAt(3), saveAt(2), saveAt(1)]);
    expect(evening?.saves.map(({ version }) => version)).toEqual([4, 3, 2]);
    expect(evening?.changes?.massBy).toBe(3);
    expect(evening?.changes?.balanceBy).toBeCloseTo(0.3, 12);
  });

  it('part where somebody else saved, and where a quarter of an hour went by', () => {
    expect(grouped([saveAt(4), saveAt(3, { savedBy: 'Odile' }), saveAt(2)])).toEqual([[4], [3], [2]]);
    expect(grouped([saveAt(20), saveAt(5), saveAt(4)])).toEqual([[20], [5, 4]]);
  });

  it('are of one state where it was named, brought back, or is the first', () => {
    expect(grouped([saveAt(5), saveAt(4, { name: 'Before cutting' }), saveAt(3), saveAt(2)])).toEqual([
      [5],
      [4],
      [3, 2],
    ]);
    expect(grouped([saveAt(4), saveAt(3, { restoredFrom: 1 }), saveAt(2), saveAt(1)])).toEqual([
      [4],
      [3],
      [2],
      [1],
    ]);
  });

  it('keep every save, in its order', () => {
    const saves = Array.from({ length: 40 }, (_, i) =>
      saveAt(40 - i, { savedBy: i % 7 === 0 ? 'Odile' : 'Ines', name: i % 11 === 3 ? 'x' : null }),
    );
    expect(grouped(saves).flat()).toEqual(saves.map(({ version }) => version));
  });
});
