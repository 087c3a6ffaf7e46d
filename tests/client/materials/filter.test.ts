import { describe, expect, it } from 'vitest';
import { countMaterials, filterMaterials } from '#client/features/materials/filter.ts';
import type { MaterialDto } from '#shared/schemas/material.ts';

const balsa: MaterialDto = {
  id: '1',
  key: 'balsa',
  name: 'Balsa',
  category: 'wood',
  density: 112,
  areal: null,
  spread: null,
  cv: 0.08,
  modulus: null,
  strength: null,
  moisture: null,
  form: '',
  source: 'weighed',
  basis: 'own measurement',
  shared: true,
  version: 1,
  usedBy: 0,
  can: { edit: false, delete: false },
};
const row = (name: string, fields: Partial<MaterialDto> = {}): MaterialDto => ({ ...balsa, name, ...fields });
const table = [
  row('Balsa, light'),
  row('Balsa, hard', { form: 'C cut, for ribs' }),
  row('Seidenpapier für Flügel', { category: 'covering', shared: false }),
];
const names = (rows: MaterialDto[]) => rows.map(({ name }) => name);

describe('search in the materials', () => {
  it('asks for every word, in any order and column', () => {
    expect(names(filterMaterials(table, 'ribs balsa', 'all'))).toEqual(['Balsa, hard']);
  });

  it('does not mind accents or case', () => {
    expect(names(filterMaterials(table, 'FLUGEL', 'all'))).toEqual(['Seidenpapier für Flügel']);
  });

  it('finds a kind by its name on screen', () => {
    expect(names(filterMaterials(table, 'covering', 'all'))).toEqual(['Seidenpapier für Flügel']);
  });

  it('joins search and kind', () => {
    expect(filterMaterials(table, 'balsa', 'covering')).toEqual([]);
  });

  it('counts what is one’s own apart from the kinds', () => {
    expect([
      countMaterials(table, 'own'),
      countMaterials(table, 'wood'),
      countMaterials(table, 'all'),
    ]).toEqual([1, 2, 3]);
  });
});
