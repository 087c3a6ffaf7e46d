import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import { printedSheet } from '#shared/core/printed-sheet.ts';
import { printingOf } from '#shared/format/printing.ts';
import { INCH_CHOICES, unitsOf, USUAL_UNITS } from '#shared/format/units.ts';
import { unitChoices } from '#shared/schemas/preferences.ts';
import { QUANTITIES, type Quantity } from '#shared/units/quantities.ts';
import { UNITS } from '#shared/units/units.ts';
import { demoPlan } from '#tests/support/plans.ts';

const plain = (text: string) => text.replaceAll('\u202f', ' ');
const inch = unitsOf(INCH_CHOICES);

// Figures follow from inch = 25.4 mm and ounce = 28.349523125 g (NIST SP 811).
describe('a reader’s units', () => {
  it('are mm and g until something else is chosen', () => {
    expect(plain(USUAL_UNITS.format(88.9, 'length'))).toBe('88.9 mm');
    expect(USUAL_UNITS.label('loading')).toBe('g/dm²');
    expect(USUAL_UNITS.system).toBe('metric');
  });

  it('are chosen for each quantity on its own', () => {
    const mixed = unitsOf({ length: 'in' });
    expect(plain(mixed.format(88.9, 'length'))).toBe('3.500 in');
    expect(plain(mixed.format(28.349523125, 'mass'))).toBe('28.3 g');
    expect(mixed.label('classArea')).toBe('dm²');
  });

  it('count class area in the unit chosen for areas', () => {
    expect(unitsOf({ area: 'in2' }).label('classArea')).toBe('in²');
  });

  it('never fail on a choice that the quantity does not have', () => {
    expect(unitsOf({ mass: 'mm' as 'g' }).unit('mass')).toBe('g');
  });

  it('name stock in inches by its fraction, and only then', () => {
    expect(plain(inch.format(1.5875, 'length', { stock: true }))).toBe('1/16 in');
    expect(plain(inch.format(1.5, 'length', { stock: true }))).toBe('0.059 in');
    expect(plain(inch.format(1.5875, 'length'))).toBe('0.063 in');
    expect(plain(USUAL_UNITS.format(1.5875, 'length', { stock: true }))).toBe('1.6 mm');
  });

  it('tell a size as short as it goes', () => {
    expect(plain(USUAL_UNITS.size(300))).toBe('300 mm');
    expect(USUAL_UNITS.size(1.5, { bare: true })).toBe('1.5');
    expect(plain(inch.size(787.4))).toBe('31 in');
    expect(inch.size(6.35, { bare: true, decimal: true })).toBe('0.25');
    expect(inch.size(null)).toBe('–');
  });

  it('tell the area of one part in a unit of its size', () => {
    expect(plain(USUAL_UNITS.format(31_930, 'area', { small: true }))).toBe('319.3 cm²');
    expect(plain(inch.format(31_930, 'area', { small: true }))).toBe('49.5 in²');
  });

  it('never print an uncertainty as none', () => {
    expect(plain(inch.doubt(0.1, 'mass'))).toBe('0.01 oz');
    expect(plain(USUAL_UNITS.doubt(0.01, 'mass'))).toBe('0.1 g');
    expect(plain(USUAL_UNITS.doubt(0, 'mass'))).toBe('0.0 g');
  });

  it('of inches and ounces are choices that an account may keep', () => {
    expect(unitChoices.safeParse(INCH_CHOICES).success).toBe(true);
    expect(inch.system).toBe('inch');
    expect(inch.long).toBe('ft');
  });

  it('have a figure for every quantity in every unit that may be chosen', () => {
    for (const quantity of Object.keys(QUANTITIES) as Quantity[]) {
      for (const unit of QUANTITIES[quantity].units) {
        const text = unitsOf({ [quantity]: unit }).format(1234.5, quantity);
        expect(text, `${quantity} in ${unit}`).toContain(UNITS[unit].label);
      }
    }
  });
});

describe('a balance sheet in inches and ounces', () => {
  const result = estimate(demoPlan('dunlin'));
  const { groups, total, digits } = printedSheet(result, printingOf(inch));

  it('comes to the total mass in ounces, and its parts add up to it', () => {
    expect(Number(total.mass)).toBeCloseTo(result.totals.mass / 28.349523125, 2);
    const hundredths = (text: string) => Math.round(Number(text) * 100);
    expect(groups.reduce((sum, { mass }) => sum + hundredths(mass), 0)).toBe(hundredths(total.mass));
  });

  it('has its arms in inches', () => {
    expect(Number(total.arm)).toBeCloseTo((result.balance.x ?? 0) / 25.4, 3);
    expect(digits).toEqual({ mass: 2, u: 2, arm: 3, moment: 2, share: 1 });
  });

  it('has true arms also where moments are kept in g·mm', () => {
    const mixed = printedSheet(result, printingOf(unitsOf({ length: 'in' })));
    expect(Number(mixed.total.arm)).toBeCloseTo((result.balance.x ?? 0) / 25.4, 3);
    expect(Number(mixed.total.mass)).toBeCloseTo(result.totals.mass, 1);
  });
});
