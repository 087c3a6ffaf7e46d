import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

const css = readFileSync(new URL('../../../client/styles/tokens.css', import.meta.url), 'utf8');

/** The colours of a theme, as hexadecimal figures by their names. */
function themeOf(selector: string): Record<string, string> {
  const body = css.slice(css.indexOf(`${selector} {`)).split('}')[0] ?? '';
  return Object.fromEntries(
    [...body.matchAll(/--([\w-]+): (#[0-9a-f]{6});/g)].map(([, name, hex]) => [name, hex]),
  );
}

/** Relative luminance of an sRGB colour (WCAG 2.2, definitions). */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5]
    .map((at) => Number.parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((share) => (share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4));
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

/** Contrast ratio of two colours (WCAG 2.2, 1.4.3). */
function contrast(a: string, b: string): number {
  const [light = 0, dark = 0] = [luminance(a), luminance(b)].toSorted((x, y) => y - x);
  return (light + 0.05) / (dark + 0.05);
}

const THEMES = { light: themeOf(':root'), dark: themeOf('.dark') };
const GROUNDS = ['paper', 'sheet'];
const TEXT: [string, string[]][] = [
  ['pencil', [...GROUNDS, 'ink-wash', 'red-wash', 'ochre-wash', 'wood-light']],
  ['graphite', GROUNDS],
  ['ink', [...GROUNDS, 'ink-wash']],
  ['ink-deep', [...GROUNDS, 'ink-wash']],
  ['on-ink', ['ink', 'ink-deep']],
  ['red', [...GROUNDS, 'red-wash']],
  ['ochre', [...GROUNDS, 'ochre-wash']],
];
const LINES: [string, string[]][] = [
  ['pencil', ['wood', 'wood-light']],
  ['graphite', [...GROUNDS, 'ink-wash']],
  ['ink', ['wood-light']],
  ['grain', ['wood']],
];

describe.each(Object.entries(THEMES))('the colours of the %s theme', (_, colours) => {
  const pairs = (table: [string, string[]][]) =>
    table.flatMap(([front, backs]) => backs.map((back) => [front, back] as const));
  const ratio = (front: string, back: string) => contrast(colours[front] ?? '', colours[back] ?? '');

  it.each(pairs(TEXT))('lets text in %s be read on %s: 4.5 to 1', (front, back) => {
    expect(ratio(front, back)).toBeGreaterThanOrEqual(4.5);
  });

  it.each(pairs(LINES))('lets a line in %s be seen on %s: 3 to 1', (front, back) => {
    expect(ratio(front, back)).toBeGreaterThanOrEqual(3);
  });
});

describe.each([
  ['light', { ...THEMES.light, ...themeOf('\n.in-sun') }],
  ['dark', { ...THEMES.dark, ...themeOf('.dark .in-sun') }],
] as const)('the colours of the %s theme in sunlight', (_, colours: Record<string, string>) => {
  const pairs = TEXT.flatMap(([front, backs]) => backs.map((back) => [front, back] as const));

  it.each(pairs.filter(([, back]) => back !== 'wood-light'))(
    'let text in %s be read on %s: 7 to 1 (WCAG 2.2, 1.4.6)',
    (front, back) => {
      expect(contrast(colours[front] ?? '', colours[back] ?? '')).toBeGreaterThanOrEqual(7);
    },
  );
});

describe('the measure of contrast', () => {
  it('is 21 for black on white, and 4.54 for #767676 on white, as the guideline’s own examples have it', () => {
    expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 9);
    expect(contrast('#767676', '#ffffff')).toBeCloseTo(4.54, 2);
  });
});
