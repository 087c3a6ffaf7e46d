import { describe, expect, it } from 'vitest';
import { presetOf, UNIT_ROWS, unitIn, withUnit } from '#client/features/account/unit-list.ts';
import { INCH_CHOICES, unitsOf } from '#shared/format/units.ts';
import { unitChoices } from '#shared/schemas/preferences.ts';
import { QUANTITIES } from '#shared/units/quantities.ts';

describe('the units that a reader chooses', () => {
  it('are told as one of the two usual sets, or as a set of their own', () => {
    expect(presetOf({})).toBe('metric');
    expect(presetOf(INCH_CHOICES)).toBe('inch');
    expect(presetOf({ length: 'in' })).toBe('mixed');
    expect(presetOf({ ...INCH_CHOICES, mass: 'g' })).toBe('mixed');
  });

  it('keep nothing that is as usual, so that an account holds only what differs', () => {
    expect(withUnit({}, 'length', 'in')).toEqual({ length: 'in' });
    expect(withUnit({ length: 'in', mass: 'oz' }, 'length', 'mm')).toEqual({ mass: 'oz' });
  });

  it('are all such that an account may keep them', () => {
    for (const { quantity } of UNIT_ROWS) {
      for (const unit of QUANTITIES[quantity].units) {
        const chosen = withUnit({}, quantity, unit);
        expect(unitChoices.safeParse(chosen).success, `${quantity} in ${unit}`).toBe(true);
        expect(unitIn(chosen, quantity)).toBe(unit);
      }
    }
  });

  it('show another figure in each unit of a quantity', () => {
    for (const { quantity, example } of UNIT_ROWS) {
      const shown = QUANTITIES[quantity].units.map((unit) =>
        unitsOf({ [quantity]: unit }).format(example, quantity),
      );
      expect(new Set(shown).size, quantity).toBe(shown.length);
    }
  });
});
