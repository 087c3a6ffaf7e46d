import { describe, expect, it } from 'vitest';
import { sourcesIn, withoutComments } from './sources.ts';

/** Speak of a unit that they are given, not of the reader's. */
const GIVEN_UNITS = new Set(['number-text', 'number-words'].map((name) => `client/components/ui/${name}.ts`));
/** Quantities that have one unit for everybody, and units named on purpose, such as both of two systems. */
const PLAIN = /'(share|fineShare|percentMac|ratio|reynolds|count|angle)'|\bunit:/;
/** A unit that a reader may have chosen otherwise, written out behind a figure. */
const WRITTEN_OUT = /(?:\}\s|NARROW_SPACE\}|\\u202f|\u202f)(?:mm|dm²|g\/dm²|kg\/m³|g\/m²|m\/s)(?![\w/²])/;

/** What is wrong with a text that shows figures. */
function offences(path: string, code: string): string[] {
  const past = callsOf(code, 'formatQuantity').filter((call) => !PLAIN.test(call));
  return [
    ...past.map((call) => `${path} formats past the reader's units: ${call}`),
    ...(/\bunitLabel\(/.test(code) ? [`${path} names a unit past the reader's`] : []),
    ...(WRITTEN_OUT.test(code) ? [`${path} writes a unit out`] : []),
  ];
}

/** Every call of a function with its arguments, brackets matched. */
function callsOf(code: string, name: string): string[] {
  return [...code.matchAll(new RegExp(`\\b${name}\\(`, 'g'))].map(({ index, 0: head }) => {
    let depth = 1;
    let end = index + head.length;
    while (end < code.length && depth > 0) {
      if (code[end] === '(') depth++;
      if (code[end] === ')') depth--;
      end++;
    }
    return code.slice(index, end);
  });
}

describe('figures on the screen', () => {
  it('follow the units that the reader chose', () => {
    const sources = sourcesIn(['client'], /\.tsx?$/).filter(({ path }) => !GIVEN_UNITS.has(path));
    expect(sources.length).toBeGreaterThan(100);
    expect(sources.flatMap(({ path, code }) => offences(path, code))).toEqual([]);
  });
});

describe('the reader of formats', () => {
  const told = (text: string) => offences('x.ts', withoutComments(text));

  it.each([
    "formatQuantity(mass, 'mass')",
    'formatQuantity(of(value), quantity)',
    "unitLabel('mass')",
    'const a = `${value}${NARROW_SPACE}mm.`;',
    'const a = `${density} kg/m³`;',
    'const a = `${speed} m/s.`;',
    'const a = <p>{length} mm of span</p>;',
  ])('finds %s', (text) => {
    expect(told(text)).toHaveLength(1);
  });

  it.each([
    "formatQuantity(of(x), 'share')",
    "formatQuantity(x, 'length', { unit: 'mm' })",
    'const a = `g = ${gravity} m/s²`;',
    'const a = `${formatNumber(x, 1)} % MAC and ${count} models`;',
    "// formatQuantity(mass, 'mass') would be wrong here",
    "const path = `M${x} 4`; const size = '3 mm';",
  ])('lets %s be', (text) => {
    expect(told(text)).toEqual([]);
  });
});
