import { noteWords, problemWords } from '#client/features/drawing/forms/section-findings.ts';
import { readSectionText } from '#shared/sections/read-section.ts';
import { describe, expect, it } from 'vitest';
import { outlineText, parseOutline } from '#client/features/drawing/forms/outline-text.ts';
import { parseSection, pointsText, sectionText } from '#client/features/drawing/forms/section-text.ts';
import { parseStations, stationsText } from '#client/features/drawing/forms/station-text.ts';
import { partNote, partSize } from '#client/features/drawing/lists/size-text.ts';
import { unitsOf, USUAL_UNITS } from '#shared/format/units.ts';
import { demoPlan } from '#tests/support/plans.ts';

const problem = (read: object) => ('problem' in read ? String(read.problem) : '');

describe('stations as text', () => {
  it('are read back as they were written', () => {
    const stations = [0, 42.5, 585];
    expect(stationsText(stations, USUAL_UNITS)).toBe('0; 42.5; 585');
    expect(parseStations(stationsText(stations, USUAL_UNITS), USUAL_UNITS)).toEqual({ value: stations });
  });

  it('may be inches and fractions between semicolons (25.4 mm, NIST SP 811)', () => {
    expect(parseStations('0; 1 1/2 in; 100', USUAL_UNITS)).toEqual({
      value: [0, expect.closeTo(38.1, 9), 100],
    });
    expect(parseStations('0 50  100', USUAL_UNITS)).toEqual({ value: [0, 50, 100] });
  });

  it('are refused with the piece that is no length', () => {
    expect(problem(parseStations('0; fifty', USUAL_UNITS))).toContain('“fifty”');
    expect(problem(parseStations('  ', USUAL_UNITS))).toContain('at least one');
  });
});

describe('a section as text', () => {
  it('is four digits, a plate, or the name of own points', () => {
    expect(sectionText({ naca: '4409' }, USUAL_UNITS)).toBe('4409');
    expect(sectionText({ flat: 3 }, USUAL_UNITS)).toBe('plate 3 mm');
    expect(sectionText({ name: 'Mine', points: [] }, USUAL_UNITS)).toBe('Mine');
    expect(parseSection('NACA 2412', { flat: 3 }, USUAL_UNITS)).toEqual({ value: { naca: '2412' } });
    expect(parseSection('plate 3', { naca: '4409' }, USUAL_UNITS)).toEqual({ value: { flat: 3 } });
    expect(parseSection('1/8 in', { naca: '4409' }, USUAL_UNITS)).toEqual({ value: { flat: 3.175 } });
    expect(parseSection('2', { flat: 3 }, USUAL_UNITS)).toEqual({ value: { flat: 2 } });
  });

  it('does not take half-typed digits for a thick plate', () => {
    expect(problem(parseSection('44', { naca: '4409' }, USUAL_UNITS))).toContain('four digits');
    expect(problem(parseSection('4400', { naca: '4409' }, USUAL_UNITS))).toContain('thickness');
  });

  it('keeps own points when only their name is typed over', () => {
    const points: [number, number][] = [
      [1, 0],
      [0, 0],
    ];
    expect(parseSection('Thin', { name: 'Mine', points }, USUAL_UNITS)).toEqual({
      value: { name: 'Thin', points },
    });
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
    expect(readSectionText(`Some title\n${pointsText({ points })}`)).toMatchObject({
      section: { name: 'Some title', points },
    });
  });

  it.each([
    ['1 0\n0.5 x\n0 0\n0.5 0\n1 0', 'Line 2, “0.5 x”, is not two numbers.'],
    ['1 0\n0 0', 'Only 2 points are found; a section takes at least 5.'],
    ['', 'No points are found.'],
    ['4 4\n0 0\n.5 .1\n1 0\n0 0\n1 0', 'Line 1 says 8 points; 5 follow.'],
    ['1 0\n.5 .1\n.7 .1\n0 0\n.5 0\n1 0', 'goes back along the first face'],
    ['1 0\n.5 1.9\n0 0\n.5 -.1\n1 0', 'Line 2, “.5 1.9”, lies farther from the chord'],
    ['1 0\n.5 .1\n0 0\n.3 0\n.6 0', 'At line 5 the second face ends far before the trailing edge.'],
    ['0 .2\n.5 .3\n1 0\n\n0 0\n.5 0\n1 0', 'At line 5 the second face begins 20.0 % of the chord'],
    ['0 1\n0 2\n0 3\n0 4\n0 5', 'all points have the same x'],
  ])('are refused in words that name the line: %#', (text, words) => {
    const reading = readSectionText(text);
    expect('problem' in reading && problemWords(reading.problem)).toContain(words);
  });

  it('tell in words what was mended', () => {
    expect(noteWords({ code: 'thinned', from: 5002, to: 812, tolerance: 3.2e-6 })).toBe(
      '5\u202f002 points are thinned to 812; none left out lies more than 0.0003 % of the chord off the line.',
    );
    expect(noteWords({ code: 'nose_joined', gap: 0.0312 })).toContain('open by 3.1 %');
    expect(noteWords({ code: 'scaled', chord: 187 })).toContain('187.00');
  });
});

describe('a plate’s outline as text', () => {
  it('is read back as it was written', () => {
    const outline: [number, number][] = [
      [-150, -10.5],
      [100, -20],
      [100, 20],
    ];
    expect(parseOutline(outlineText(outline, USUAL_UNITS), USUAL_UNITS)).toEqual({ value: outline });
  });

  it('is refused with the corner that is none, or with too few', () => {
    expect(problem(parseOutline('0 0; 10; 5 5', USUAL_UNITS))).toContain('“10”');
    expect(problem(parseOutline('0 0; 10 0', USUAL_UNITS))).toContain('at least 3');
  });
});

describe('sizes in the list', () => {
  it('are short, tapers as from–to', () => {
    const parts = demoPlan('dunlin').surfaces[0]!.parts;
    const of = (id: string) => parts.find((part) => part.id === id)!;
    const size = (part: object, units = USUAL_UNITS) => partSize(part as never, units);
    expect(size({ ...of('spar-top'), width: [5, 3], height: [2, 2] })).toBe('5–3 × 2');
    expect(size(of('tip'))).toMatch(/^\d+ long$/);
    expect(partNote(of('ribs-inner'))).toBe('9 a side');
    // 1/4 in = 6.35 mm and 3/32 in = 2.38125 mm (25.4 mm, NIST SP 811).
    const inches = unitsOf({ length: 'in' });
    const spruce = { ...of('spar-top'), width: [6.35, 6.35], height: [2.38125, 2.38125] };
    expect(size(spruce, inches)).toBe('1/4 × 3/32');
  });
});

describe('in inches', () => {
  const inches = unitsOf({ length: 'in' });

  it('stations and corners are written and read in inches (25.4 mm, NIST SP 811)', () => {
    expect(stationsText([0, 38.1, 590.55], inches)).toBe('0; 1 1/2; 23 1/4');
    expect(parseStations('0; 1 1/2; 100 mm', inches)).toEqual({
      value: [0, expect.closeTo(38.1, 9), 100],
    });
    const outline: [number, number][] = [
      [-25.4, 6.35],
      [12.7, -6.35],
      [12.7, 6.35],
    ];
    expect(outlineText(outline, inches)).toBe('\u22121 0.25; 0.5 \u22120.25; 0.5 0.25');
    expect(parseOutline(outlineText(outline, inches), inches)).toEqual({ value: outline });
  });

  it('a plate is named as its sheet is sold', () => {
    expect(sectionText({ flat: 3.175 }, inches)).toBe('plate 1/8 in');
    expect(parseSection('plate 1/16', { naca: '4409' }, inches)).toEqual({ value: { flat: 1.5875 } });
  });
});
