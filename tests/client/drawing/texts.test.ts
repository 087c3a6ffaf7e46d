import { describe, expect, it } from 'vitest';
import { outlineText, parseOutline } from '#client/features/drawing/forms/outline-text.ts';
import {
  parsePoints,
  parseSection,
  pointsText,
  sectionText,
} from '#client/features/drawing/forms/section-text.ts';
import { parseStations, stationsText } from '#client/features/drawing/forms/station-text.ts';
import { partNote, partSize } from '#client/features/drawing/lists/size-text.ts';
import { demoPlan } from '#tests/support/plans.ts';

const problem = (read: object) => ('problem' in read ? String(read.problem) : '');

describe('stations as text', () => {
  it('are read back as they were written', () => {
    const stations = [0, 42.5, 585];
    expect(stationsText(stations)).toBe('0; 42.5; 585');
    expect(parseStations(stationsText(stations))).toEqual({ value: stations });
  });

  it('may be inches and fractions between semicolons (25.4 mm, NIST SP 811)', () => {
    expect(parseStations('0; 1 1/2 in; 100')).toEqual({ value: [0, expect.closeTo(38.1, 9), 100] });
    expect(parseStations('0 50  100')).toEqual({ value: [0, 50, 100] });
  });

  it('are refused with the piece that is no length', () => {
    expect(problem(parseStations('0; fifty'))).toContain('“fifty”');
    expect(problem(parseStations('  '))).toContain('at least one');
  });
});

describe('a section as text', () => {
  it('is four digits, a plate, or the name of own points', () => {
    expect(sectionText({ naca: '4409' })).toBe('4409');
    expect(sectionText({ flat: 3 })).toBe('plate 3 mm');
    expect(sectionText({ name: 'Mine', points: [] })).toBe('Mine');
    expect(parseSection('NACA 2412', { flat: 3 })).toEqual({ value: { naca: '2412' } });
    expect(parseSection('plate 3', { naca: '4409' })).toEqual({ value: { flat: 3 } });
    expect(parseSection('1/8 in', { naca: '4409' })).toEqual({ value: { flat: 3.175 } });
    expect(parseSection('2', { flat: 3 })).toEqual({ value: { flat: 2 } });
  });

  it('does not take half-typed digits for a thick plate', () => {
    expect(problem(parseSection('44', { naca: '4409' }))).toContain('four digits');
    expect(problem(parseSection('4400', { naca: '4409' }))).toContain('thickness');
  });

  it('keeps own points when only their name is typed over', () => {
    const points: [number, number][] = [
      [1, 0],
      [0, 0],
    ];
    expect(parseSection('Thin', { name: 'Mine', points })).toEqual({ value: { name: 'Thin', points } });
  });
});

describe('pasted points', () => {
  const points: [number, number][] = [
    [1, 0.001],
    [0.5, 0.08],
    [0, 0],
    [0.5, -0.02],
    [1, -0.001],
  ];

  it('are read back as they were written, past a title line', () => {
    expect(parsePoints(`Some title\n${pointsText({ points })}`)).toEqual({ value: points });
  });

  it('may be per cent of the chord and have decimal commas', () => {
    expect(parsePoints('100 0,1\n50 8\n0 0\n50 -2\n100 -0.1')).toEqual({ value: points });
  });

  it('are refused with the line that is wrong, and in the wrong order', () => {
    expect(problem(parsePoints('1 0\n0.5 x\n0 0'))).toContain('Line 2');
    expect(problem(parsePoints('1 0\n0 0'))).toContain('at least 5');
    expect(problem(parsePoints('0 0\n0.5 0.1\n1 0\n0.5 -0.1\n0 0'))).toContain('trailing edge');
    expect(problem(parsePoints('1 0\n0.5 1.9\n0 0\n0.5 -0.1\n1 0'))).toContain('far off the chord');
  });
});

describe('a plate’s outline as text', () => {
  it('is read back as it was written', () => {
    const outline: [number, number][] = [
      [-150, -10.5],
      [100, -20],
      [100, 20],
    ];
    expect(parseOutline(outlineText(outline))).toEqual({ value: outline });
  });

  it('is refused with the corner that is none, or with too few', () => {
    expect(problem(parseOutline('0 0; 10; 5 5'))).toContain('“10”');
    expect(problem(parseOutline('0 0; 10 0'))).toContain('at least 3');
  });
});

describe('sizes in the list', () => {
  it('are short, tapers as from–to', () => {
    const parts = demoPlan('dunlin').surfaces[0]!.parts;
    const of = (id: string) => parts.find((part) => part.id === id)!;
    expect(partSize({ ...of('spar-top'), width: [5, 3], height: [2, 2] } as never)).toBe('5–3 × 2');
    expect(partSize(of('tip'))).toMatch(/^\d+ long$/);
    expect(partNote(of('ribs-inner'))).toBe('9 a side');
  });
});
