import { describe, expect, it } from 'vitest';
import { besideOf, stepped, textOf, underneathOf } from '#client/components/ui/number-text.ts';
import { boundIn, rangeText } from '#client/components/ui/number-words.ts';

// Expected texts follow from 1 in = 25.4 mm exactly (NIST SP 811); the choice of what to show is our own.
describe('text of a field that was not typed into', () => {
  it('shows 1.5875 mm as the 1/16 in that it is sold as', () => {
    expect(textOf(1.5875, 'length', 'mm')).toBe('1/16 in');
  });

  it('leaves whole tenths of a mm metric, though 25.4 mm is also an inch', () => {
    expect(textOf(25.4, 'length', 'mm')).toBe('25.4');
  });

  it('does not take 1.59 mm for 1/16 in', () => {
    expect(textOf(1.59, 'length', 'mm')).toBe('1.59');
  });

  it('shows stock in inches by its fraction down to 1/64 in, and what is none in decimals', () => {
    // 31/64 in = 12.303125 mm; 372.5 mm = 14.66535 in (25.4 mm, NIST SP 811)
    expect(textOf(12.303125, 'length', 'in')).toBe('31/64');
    expect(textOf(88.9, 'length', 'in')).toBe('3 1/2');
    expect(textOf(372.5, 'length', 'in')).toBe('14.665');
  });

  it('shows a share in per cent without noise of binary fractions', () => {
    expect(textOf(0.07, 'share', 'percent')).toBe('7');
  });

  it('writes a true minus', () => {
    expect(textOf(-132, 'length', 'mm')).toBe('\u2212132');
  });

  it('shows nothing, and not 0, for what is not there', () => {
    expect([textOf(null, 'mass', 'g'), textOf(NaN, 'mass', 'g')]).toEqual(['', '']);
  });
});

describe('what stands behind a field', () => {
  it('says what inches are in mm', () => {
    expect(besideOf('1/16 in', 'length', 'mm')).toBe('= 1.59\u202fmm');
  });

  it('in a cell tells only what another unit or a sum comes to', () => {
    expect(underneathOf('14 1/2 in', 'length', 'mm')).toBe('= 368.3');
    expect(underneathOf('12+3.5', 'length', 'mm')).toBe('= 15.5');
    expect(underneathOf('6 mm + 1/4', 'length', 'in')).toBe('= 0.486');
    expect([underneathOf('372,5', 'length', 'mm'), underneathOf('', 'length', 'mm')]).toEqual(['', '']);
  });

  it('says what a sum comes to', () => {
    expect(besideOf('12+3.5', 'length', 'mm')).toBe('= 15.5\u202fmm');
  });

  it('tells the same in the other system', () => {
    // 0.4 oz = 11.34 g, 112 kg/m³ = 6.99 lb/ft³ (ounce and pound as in NIST SP 811)
    expect(besideOf('2,5', 'length', 'mm')).toBe('mm · 0.0984\u202fin');
    expect(besideOf('0.4', 'mass', 'oz')).toBe('oz · 11.3\u202fg');
    expect(besideOf('112', 'density', 'kg/m3')).toBe('kg/m³ · 7.0\u202flb/ft³');
    expect(besideOf('2', 'length', 'in')).toBe('in · 50.8\u202fmm');
  });

  it('tells no second unit where both systems share one', () => {
    expect([besideOf('4', 'angle', 'deg'), besideOf('40', 'percentMac', 'percent')]).toEqual(['°', '%']);
  });

  it('names the fraction that a metric size happens to be', () => {
    expect(besideOf('12.7', 'length', 'mm')).toBe('mm · 1/2\u202fin');
  });

  it('is the bare unit while the text is no number', () => {
    expect(besideOf('1/', 'length', 'mm')).toBe('mm');
  });
});

describe('arrow keys', () => {
  it('step by half a mm', () => {
    expect(stepped('380', 'length', 'mm', 1)).toBe('380.5');
  });

  it('step by sixteenths in a field of inches, from decimals to the next decimal', () => {
    expect(stepped('15 1/2', 'length', 'in', 1)).toBe('15 9/16');
    expect(stepped('31/2', 'length', 'in', -1)).toBe('15 7/16');
    expect(stepped('14.665', 'length', 'in', 1)).toBe('14.728');
  });

  it('step by sixteenths in a field typed in inches', () => {
    expect(stepped('1/16 in', 'length', 'mm', 1)).toBe('1/8 in');
  });

  it('count ribs one by one', () => {
    expect(stepped('12', 'count', 'one', -1)).toBe('11');
  });

  it('leave an unfinished text alone', () => {
    expect(stepped('1/', 'length', 'mm', 1)).toBe('1/');
  });
});

describe('size of a value', () => {
  it('refuses the bound itself where more is asked for', () => {
    expect(rangeText(0, { quantity: 'length', unit: 'mm', above: 0 })).toBe('Must be more than 0 mm.');
  });

  it('tells the bound of a plan’s rule in the field’s own unit', () => {
    // 20 000 mm = 787.402 in, 100 000 g = 3527.396 oz (NIST SP 811)
    expect(boundIn('Must be at most 20000 mm.', 'length', 'in')).toBe('Must be at most 787.402 in.');
    expect(boundIn('Must be at most 20000 mm.', 'length', 'mm')).toBe('Must be at most 20000 mm.');
    expect(boundIn('Must be at most 100000.', 'mass', 'oz')).toBe('Must be at most 3527.396 oz.');
    expect(boundIn('Must be at most 0.9.', 'share', 'percent')).toBe('Must be at most 90 %.');
    expect(boundIn('Must be a number.', 'length', 'in')).toBe('Must be a number.');
  });

  it('names the bound in the unit of the field', () => {
    expect(rangeText(0.95, { quantity: 'share', unit: 'percent', max: 0.9 })).toBe('Must be at most 90 %.');
  });
});
