import convertUnits from 'convert-units';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { unitName } from '#shared/units/names.ts';
import { otherUnit, QUANTITIES, type Quantity } from '#shared/units/quantities.ts';
import { convert, UNITS, type Unit } from '#shared/units/units.ts';

/** Two roundings of a double at most lie between a factor and its definition. */
const ROUNDING = 4e-16;
const relative = (value: number, expected: number) => Math.abs(value / expected - 1);
const units = Object.keys(UNITS) as Unit[];

describe('factors', () => {
  // NIST SP 811 (2008), appendix B.8 and its footnotes: exact by definition, or derived from those by hand.
  const exact: [Unit, Unit, number][] = [
    ['in', 'mm', 25.4],
    ['ft', 'mm', 304.8],
    ['in2', 'mm2', 645.16],
    ['ft2', 'dm2', 9.290304],
    ['in3', 'mm3', 16387.064],
    ['lb', 'g', 453.59237],
    ['oz', 'g', 28.349523125],
    ['ft/s', 'm/s', 0.3048],
    ['mph', 'm/s', 0.44704],
    ['oz.in', 'g.mm', 720.077887375],
  ];
  test.each(exact)('one %s is %s × %d by definition', (from, to, expected) => {
    expect(relative(convert(1, from, to as never), expected)).toBeLessThanOrEqual(ROUNDING);
  });

  // NIST SP 811 (2008), appendix B.8, which prints seven digits.
  const printed: [Unit, Unit, number][] = [
    ['lb/ft3', 'kg/m3', 16.01846],
    ['oz/ft2', 'g/m2', 305.1517],
    ['oz/yd2', 'g/m2', 33.90575],
    ['psi', 'MPa', 0.006894757],
    ['ksi', 'MPa', 6.894757],
    ['km/h', 'm/s', 0.2777778],
  ];
  test.each(printed)('one %s is %s × %d to the seven digits printed', (from, to, expected) => {
    expect(relative(convert(1, from, to as never), expected)).toBeLessThan(5e-7);
  });

  test('one ounce per square foot is 3.0515173 g/dm²', () => {
    // (453.59237 / 16) g over (3.048 dm)², worked by hand
    expect(relative(convert(1, 'oz/ft2', 'g/dm2'), 28.349523125 / 9.290304)).toBeLessThan(1e-15);
    expect(convert(1, 'oz/ft2', 'g/dm2')).toBeCloseTo(3.0515173, 7);
  });
});

describe('second opinion', () => {
  // The general converter carries rounded factors; this says by how much, and why ours come from the definitions.
  const theirs: [Unit, Unit, convertUnits.Unit, convertUnits.Unit, number][] = [
    ['in', 'mm', 'in', 'mm', 4e-8],
    ['ft', 'mm', 'ft', 'mm', 4e-8],
    ['oz', 'g', 'oz', 'g', 9e-7],
    ['lb', 'g', 'lb', 'g', 9e-7],
    ['in2', 'mm2', 'in2', 'mm2', 2e-5],
    ['ft/s', 'm/s', 'ft/s', 'm/s', 2e-5],
  ];
  test.each(theirs)(
    '%s to %s agrees with convert-units only within its rounding',
    (from, to, a, b, apart) => {
      const distance = relative(convertUnits(1).from(a).to(b), convert(1, from, to as never));
      expect(distance).toBeLessThan(apart);
      expect(distance).toBeGreaterThan(apart / 100);
    },
  );

  test('its ounce is short by 23 millionths of a gram', () => {
    expect(convertUnits(1).from('oz').to('g') - convert(1, 'oz', 'g')).toBeCloseTo(-2.31e-5, 6);
  });
});

describe('convert', () => {
  test('leaves a value in its own unit untouched to the last bit', () => {
    for (const unit of units) expect(convert(0.1 + 0.2, unit, unit as never)).toBe(0.1 + 0.2);
  });

  test('there and back is the same value, for every pair of units of one dimension', () => {
    const pairs = units.flatMap((from) =>
      units.filter((to) => UNITS[from].dimension === UNITS[to].dimension).map((to) => [from, to] as const),
    );
    fc.assert(
      fc.property(
        fc.constantFrom(...pairs),
        fc.double({ min: 1e-6, max: 1e6, noNaN: true }),
        ([from, to], value) => {
          const back = convert(convert(value, from, to as never), to, from as never);
          expect(relative(back, value)).toBeLessThan(1e-14);
        },
      ),
    );
  });

  test('62 % of the chord is exactly 0.62', () => {
    expect(convert(62, 'percent', 'one')).toBe(0.62);
    expect(convert(0.07, 'one', 'percent')).toBeCloseTo(7, 13);
  });

  test('refuses to make a mass of a length', () => {
    expect(() => convert(1, 'mm', 'g' as never)).toThrow(RangeError);
  });
});

describe('quantities', () => {
  const quantities = Object.keys(QUANTITIES) as Quantity[];

  test('base, shown and inch unit of each quantity are among those offered and measure the same thing', () => {
    for (const quantity of quantities) {
      const { base, shown, inch, units: offered } = QUANTITIES[quantity];
      const dimensions = new Set([base, shown, inch, ...offered].map((unit) => UNITS[unit].dimension));
      expect({ quantity, dimensions: dimensions.size }).toEqual({ quantity, dimensions: 1 });
      for (const unit of [base, shown, inch]) expect(offered, quantity).toContain(unit);
    }
  });

  test('the plan keeps lengths in mm, masses in g, shares as fractions and the wanted balance in per cent', () => {
    expect(QUANTITIES.length.base).toBe('mm');
    expect(QUANTITIES.mass.base).toBe('g');
    expect(QUANTITIES.share.base).toBe('one');
    expect(QUANTITIES.percentMac.base).toBe('percent');
  });

  test('the unit beside a field is the other system’s', () => {
    expect(otherUnit('length', 'mm')).toBe('in');
    expect(otherUnit('length', 'in')).toBe('mm');
    expect(otherUnit('length', 'ft')).toBe('mm');
    expect(otherUnit('length', 'm')).toBe('in');
    expect(otherUnit('loading', 'g/dm2')).toBe('oz/ft2');
    expect(otherUnit('angle', 'deg')).toBeNull();
    expect(otherUnit('percentMac', 'percent')).toBeNull();
  });

  test('every unit but the plain number has a name in words of its own', () => {
    const names = units.filter((unit) => unit !== 'one').map(unitName);
    expect(new Set(names).size).toBe(units.length - 1);
    expect(names).not.toContain('');
  });
});
