import { describe, expect, it } from 'vitest';
import { areaBetween } from '#shared/core/section-integrals.ts';
import { readSection } from '#shared/core/section.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { SectionProblem } from '#shared/sections/findings.ts';
import { readSectionText, type ReadSection } from '#shared/sections/read-section.ts';
import { facesOf, ROUND, textOf } from './texts.ts';

function sectionOf(text: string): ReadSection {
  const reading = readSectionText(text);
  if ('problem' in reading) throw new Error(JSON.stringify(reading.problem));
  return reading.section;
}

function problemOf(text: string): SectionProblem {
  const reading = readSectionText(text);
  if ('section' in reading) throw new Error('it was read');
  return reading.problem;
}

const areaOf = ({ points }: ReadSection) => areaBetween(readSection({ name: '', points }, 1), 0, 1).amount;
/** What the same points give without a text between. */
const AREA = areaBetween(readSection({ name: '', points: ROUND }, 1), 0, 1).amount;
const { upper, lower } = facesOf(ROUND);
const onlyCodes = ({ notes }: ReadSection) => notes.map(({ code }) => code);

describe('a section’s coordinates', () => {
  it('that run round from the trailing edge over the top are read as they stand', () => {
    const section = sectionOf(`Gull 44-09\n${textOf(ROUND)}`);
    expect(section).toEqual({ name: 'Gull 44-09', points: ROUND, layout: 'round', notes: [] });
  });

  it('in two faces after a line of their counts are joined at the nose', () => {
    const text = `Gull 44-09\n ${upper.length}.  ${lower.length}.\n\n${textOf(upper)}\n\n${textOf(lower)}\n`;
    expect(sectionOf(text)).toEqual({ name: 'Gull 44-09', points: ROUND, layout: 'faces', notes: [] });
  });

  it.each([
    ['parted by an empty line', `${textOf(upper)}\n\n${textOf(lower)}`, []],
    ['one right after the other', `${textOf(upper)}\n${textOf(lower)}`, []],
    ['with the underside first', `${textOf(lower)}\n\n${textOf(upper)}`, ['turned']],
    ['each from the tail', `${textOf([...upper].reverse())}\n\n${textOf([...lower].reverse())}`, []],
    ['running round under the nose', textOf([...ROUND].reverse()), ['turned']],
  ])('are understood %s', (_, text, codes) => {
    const section = sectionOf(text);
    expect(section.points).toEqual(ROUND);
    expect(onlyCodes(section)).toEqual(codes);
  });

  it.each([
    ['commas as decimal marks', textOf(ROUND, ' ').replaceAll('.', ',')],
    ['commas as decimal marks and between numbers', textOf(ROUND, ',').replaceAll('.', ',')],
    ['commas between numbers', textOf(ROUND, ',')],
    ['semicolons and commas', textOf(ROUND, ' ; ').replaceAll('.', ',')],
    ['tabs', textOf(ROUND, '\t')],
    ['the line ends of another system', textOf(ROUND).replaceAll('\n', '\r\n')],
    ['a third column of zeros', textOf(ROUND).replaceAll('\n', ' 0.0\n')],
    ['remarks behind the numbers', textOf(ROUND).replaceAll('\n', ' # measured\n')],
    ['a true minus', textOf(ROUND).replaceAll('-', '\u2212')],
    ['a mark of the byte order', `\uFEFF${textOf(ROUND)}`],
  ])('may be written with %s', (_, text) => {
    expect(sectionOf(text)).toMatchObject({ points: ROUND, notes: [] });
  });

  it('in per cent, or in millimetres of some chord, are brought to a chord of 1', () => {
    const larger = (by: number) => textOf(ROUND.map(([x, z]) => [x * by, z * by]));
    const percent = sectionOf(larger(100));
    expect(percent.notes).toEqual([{ code: 'percent' }]);
    expect(areaOf(percent)).toBeCloseTo(AREA, 9);
    const measured = sectionOf(larger(187));
    expect(measured.notes).toEqual([{ code: 'scaled', chord: 187 }]);
    expect(areaOf(measured)).toBeCloseTo(AREA, 9);
  });

  it('are not taken for counts where they are in per cent and begin with whole numbers', () => {
    const text = textOf([[100, 2], ...ROUND.slice(1).map(([x, z]): [number, number] => [x * 100, z * 100])]);
    expect(onlyCodes(sectionOf(text))).toEqual(['percent']);
  });

  it('lose what stands there twice, and say how often', () => {
    const doubled = ROUND.flatMap((point, i) => (i % 7 === 3 ? [point, point] : [point]));
    const section = sectionOf(textOf(doubled));
    expect(section.points).toEqual(ROUND);
    expect(section.notes).toEqual([{ code: 'duplicates', count: doubled.length - ROUND.length }]);
  });

  it('whose faces do not quite meet at the nose are joined straight, and that is said', () => {
    const [top, bottom] = [upper.slice(1), lower.slice(1)];
    const section = sectionOf(`${textOf(top)}\n\n${textOf(bottom)}`);
    const gap = top[0]![1] - bottom[0]![1];
    expect(section.notes).toEqual([{ code: 'nose_joined', gap: expect.closeTo(gap, 9) as number }]);
    expect(section.points).toContainEqual([0, expect.closeTo((top[0]![1] + bottom[0]![1]) / 2, 9)]);
    // All that differs is where the nose point lies: a triangle less or more.
    expect(areaOf(section)).toBeCloseTo(AREA, 4);
  });

  it('of which only one face reaches the leading edge are joined there', () => {
    const section = sectionOf(`${textOf(upper)}\n\n${textOf(lower.slice(1))}`);
    expect(section.points).toEqual(ROUND);
    expect(onlyCodes(section)).toEqual(['nose_joined']);
  });

  it('of 5,000 points are thinned to what a plan may hold, none farther off than is said', () => {
    const many = Array.from({ length: 5001 }, (_, i): [number, number] => {
      const angle = (2 * Math.PI * i) / 5000;
      return [(1 + Math.cos(angle)) / 2, 0.06 * Math.sin(angle)];
    });
    const section = sectionOf(textOf(many));
    expect(section.points.length).toBeLessThanOrEqual(LIMITS.sectionPoints.max);
    const [note] = section.notes;
    if (note?.code !== 'thinned') throw new Error('it was not thinned');
    expect(note).toMatchObject({ from: 5002, to: section.points.length + 1 });
    expect(note.tolerance).toBeLessThan(1e-4);
    // An ellipse of half axes 0.5 and 0.06: π · 0.5 · 0.06
    expect(areaOf(section)).toBeCloseTo(Math.PI * 0.03, 4);
  });
});

describe('coordinates that cannot be read', () => {
  it.each([
    ['a word among the numbers', textOf(ROUND).replace(/\n.*\n/, '\n0.95 high\n'), 'not_two_numbers', 2],
    ['three numbers in a line', textOf(ROUND).replace(/\n.*\n/, '\n0.95 0.01 0.3\n'), 'not_two_numbers', 2],
    ['counts that do not fit', `wing\n30 30\n${textOf(upper)}\n${textOf(lower)}`, 'counts_differ', 2],
    ['a point out of its order', swapped(12, 14), 'out_of_order', 14],
    ['a face that ends too early', `${textOf(upper)}\n\n${textOf(lower.slice(0, 8))}`, 'short_face', 27],
    ['a face that begins too late', `${textOf(upper)}\n\n${textOf(lower.slice(9))}`, 'short_face', 20],
    ['one point far off', textOf(ROUND).replace('0.95', '0.95 7 #'), 'far_off', 2],
  ])('are refused for %s, with the line', (_, text, code, line) => {
    expect(problemOf(text)).toMatchObject({ code, line });
  });

  it.each([
    ['nothing', ''],
    ['words', 'no section at all\nbut a letter'],
    ['four points', '1 0\n0.5 0.1\n0 0\n0.5 -0.1'],
  ])('are refused for want of points: %s', (_, text) => {
    expect(problemOf(text).code).toBe('no_points');
  });

  it('are refused where all stand upright over each other', () => {
    expect(problemOf('0 1\n0 2\n0 3\n0 4\n0 5').code).toBe('no_chord');
  });

  it('are refused unread where a text has more lines than any section', () => {
    expect(problemOf('1 0\n'.repeat(20_001))).toEqual({ code: 'too_many_lines', most: 20_000 });
  });

  it('are refused where the faces begin far from each other', () => {
    const apart = lower.map(([x, z]): [number, number] => [x, z - 0.2]);
    expect(problemOf(`${textOf(upper)}\n\n${textOf(apart)}`).code).toBe('nose_open');
  });
});

function swapped(i: number, j: number): string {
  const lines = textOf(ROUND).split('\n');
  [lines[i], lines[j]] = [lines[j] ?? '', lines[i] ?? ''];
  return lines.join('\n');
}
