import { describe, expect, it } from 'vitest';
import { ballastAdvice, refusalWords, usualPlace } from '#client/features/first-flight/ballast-advice.ts';
import { checkLines, checkState } from '#client/features/first-flight/checks.ts';
import { freshDraft, methodOf, type FlightDraft } from '#client/features/first-flight/draft.ts';
import { fieldVerdict } from '#client/features/first-flight/field-verdict.ts';
import { missingOf, recordOf } from '#client/features/first-flight/record-of.ts';
import { flightAccount } from '#client/features/first-flight/use-flight.ts';
import { basesOf, wantedRange } from '#client/features/first-flight/wanted-range.ts';
import { EXAMPLE_PLAN } from '#shared/core/example-wing.ts';
import { USUAL_UNITS } from '#shared/format/units.ts';

const WING = { area: 180_000, mac: 150, xLeMac: 0 };
const SOURCES = { target: { percentMac: 50, tolerance: 2 }, wing: WING, neutralPoint: 100 };

/** 200 g, balancing at 78 mm. */
function weighed(changes: Partial<FlightDraft> = {}): FlightDraft {
  const draft = freshDraft();
  const [front, rear] = draft.supports;
  if (!front || !rear) throw new Error('A draft begins with two supports.');
  return {
    ...draft,
    supports: [
      { ...front, reading: 96, x: 0 },
      { ...rear, reading: 104, x: 150 },
    ],
    ...changes,
  };
}
const figuresOf = (draft: FlightDraft) => flightAccount(draft, { sources: SOURCES });
const plain = (text: string) => text.replaceAll(/[\u202f\u00a0]/g, ' ');

describe('a weighing on the field', () => {
  it('is nothing until every reading and place is there', () => {
    expect(methodOf(freshDraft())).toBeNull();
    const draft = weighed();
    expect(methodOf(draft)?.kind).toBe('supports');
    expect(methodOf({ ...draft, kind: 'finger' })).toBeNull();
    expect(figuresOf(draft).account?.measured).toMatchObject({ mass: 200, x: 78 });
  });

  it('counts the sideways places only where they are asked for', () => {
    const draft = weighed();
    const apart = { ...draft, supports: draft.supports.map((one, i) => ({ ...one, y: i * 50 })) };
    const places = (sideways: boolean) => {
      const method = methodOf({ ...apart, sideways });
      return method?.kind === 'supports' ? method.supports.map(({ y }) => y) : null;
    };
    expect(places(false)).toEqual([0, 0]);
    expect(places(true)).toEqual([0, 50]);
  });

  it('has all of one scale in the next record but its readings', () => {
    const next = freshDraft(weighed({ resolution: 0.01, place: 'Upper meadow' }), 'before');
    expect(next.supports.map(({ reading, x }) => [reading, x])).toEqual([
      [null, 0],
      [null, 150],
    ]);
    expect(next).toMatchObject({ resolution: 0.01, place: 'Upper meadow', follows: 'before', checks: {} });
  });
});

describe('the range that it is held against', () => {
  it('is the drawing’s own where it has one, and else what can be had', () => {
    expect(basesOf(SOURCES)).toEqual(['plan', 'static_margin', 'typed']);
    expect(basesOf({ target: undefined, wing: WING, neutralPoint: null })).toEqual(['typed']);
    expect(wantedRange(SOURCES, freshDraft())).toEqual({ from: 72, to: 78, aim: 75, basis: 'plan' });
  });

  it('is margins ahead of the neutral point, by hand: 100 − 0.2·150 and 100 − 0.1·150', () => {
    const margins = { least: 0.1, most: 0.2 };
    const range = wantedRange(SOURCES, { ...freshDraft(), basis: 'static_margin', margins });
    expect(range).toEqual({ from: 70, to: 85, aim: 77.5, basis: 'static_margin' });
  });

  it('is none while it runs backwards', () => {
    const typed = { from: 80, to: 70 };
    expect(wantedRange(SOURCES, { ...freshDraft(), basis: 'typed', typed })).toBeNull();
  });
});

describe('the answer on the field', () => {
  const range = { from: 72, to: 78, aim: 75, basis: 'plan' as const };
  const say = (x: number, ux = 0.3) =>
    fieldVerdict({ mass: 200, u: 0.1, x, ux, percentMac: x / 1.5 }, range, WING, USUAL_UNITS);

  it.each([
    [82, 'outside', '4.0 mm aft of your range'],
    [70, 'outside', '2.0 mm ahead of your range'],
    [77.9, 'close', 'Inside, but near the aft end'],
    [72.1, 'close', 'Inside, but near the forward end'],
    [76.5, 'inside', 'Inside, 1.5 mm aft of the middle'],
    [75.2, 'inside', 'On the middle of your range'],
  ])('at %f mm is %s: %s', (x, kind, headline) => {
    const verdict = say(x);
    expect([verdict.kind, plain(verdict.headline)]).toEqual([kind, headline]);
  });

  it('gives place, doubt, chord and range', () => {
    expect(plain(say(82).detail)).toBe(
      '82.0 ± 0.3 mm aft of the datum, 54.7 % MAC. Range 48.0–52.0 %, 72.0–78.0 mm.',
    );
  });
});

describe('ballast on the field', () => {
  const range = { from: 72, to: 78, aim: 75, basis: 'plan' as const };
  const flown = { mass: 200, u: 0.1, x: 82, ux: 0.3, percentMac: null };
  const options = { flown, range, at: -50, terms: null, aboard: 0 };

  it('with no piece named is what brings it to the middle: 200·(82 − 75)/(75 + 50)', () => {
    const found = ballastAdvice({ ...options, pieces: [] });
    expect(found).toMatchObject({ ballast: 11.2, mass: 211.2 });
  });

  it('counts what is aboard against the room', () => {
    const terms = { least: null, most: null, ballastRoom: 10 };
    const found = ballastAdvice({ ...options, terms, aboard: 8, pieces: [] });
    expect(found).toHaveProperty('refused', 'no_room');
  });

  it('says what stands in the way', () => {
    const words = (refusal: Parameters<typeof refusalWords>[0]) =>
      plain(refusalWords(refusal, -50, USUAL_UNITS));
    expect(words({ refused: 'wrong_place' })).toContain('No weight 50.0 mm ahead of the datum can do it');
    expect(words({ refused: 'too_little', missing: 2 })).toContain('2.0 g too light');
    expect(words({ refused: 'no_sum', below: 3, above: 6 })).toContain('3.0 g or 6.0 g');
  });

  it('goes where the drawing has its foremost ballast', () => {
    const item = { id: 'a', name: 'A', mass: 1, at: [-20, 0, 0] as [number, number, number] };
    expect(
      usualPlace({
        items: [
          { ...item, group: 'gear', at: [-90, 0, 0] },
          { ...item, group: 'ballast' },
        ],
      }),
    ).toBe(-20);
    expect(usualPlace({ items: [{ ...item, group: 'gear' }] })).toBe(-20);
    expect(usualPlace({ items: [] })).toBe(0);
  });
});

describe('the check', () => {
  const facts = { balance: 72, stall: 4.6, wind: 2.5, ballast: 6.2, plan: { items: [] } };

  it('holds the wind against half the stall speed', () => {
    const of = (wind: number | null) => plain(checkLines({ ...facts, wind }, USUAL_UNITS).at(-1)?.hint ?? '');
    expect(of(2.5)).toBe('2.5 m/s measured: too much for a first flight. Wait.');
    expect(of(2.3)).toBe('2.3 m/s measured: less than that.');
    expect(of(null)).toContain('Measure it');
  });

  it('questions a tow hook behind the balance point', () => {
    const hook = (x: number) => ({
      id: 'h',
      name: 'Tow hook',
      group: 'gear',
      mass: 3,
      at: [x, 0, 0] as [number, number, number],
    });
    const of = (x: number) =>
      plain(
        checkLines({ ...facts, plan: { items: [hook(x)] } }, USUAL_UNITS).find(({ id }) => id === 'hook')
          ?.hint ?? '',
      );
    expect(of(60)).toBe('Drawn at 60.0 mm: 12.0 mm ahead of it.');
    expect(of(80)).toContain('Do not tow so.');
  });

  it('counts what is answered and what speaks against', () => {
    const lines = checkLines(facts, USUAL_UNITS);
    const state = checkState(lines, {
      rules: { answer: 'yes', note: '' },
      joint: { answer: 'no', note: '' },
    });
    expect([state.answered, state.open.length, state.against.map(({ id }) => id)]).toEqual([2, 9, ['joint']]);
  });
});

describe('the record that is signed', () => {
  const lines = checkLines({ balance: 78, stall: 4, wind: 1, ballast: 0, plan: EXAMPLE_PLAN }, USUAL_UNITS);
  const checks = Object.fromEntries(lines.map(({ id }) => [id, { answer: 'yes' as const, note: '' }]));

  it('names what it lacks, in the order of the page', () => {
    const draft = freshDraft();
    expect(missingOf(draft, figuresOf(draft), lines)).toEqual([
      'The weighing is not all there.',
      '11 of the check are open.',
    ]);
    const full = weighed({ checks });
    expect(missingOf(full, figuresOf(full), lines)).toEqual([]);
    const against = weighed({ checks: { ...checks, joint: { answer: 'no', note: ' ' } } });
    expect(missingOf(against, figuresOf(against), lines)).toEqual([
      'Note what is not right, where you answered no.',
    ]);
  });

  it('carries the words as they were read', () => {
    const draft = weighed({ checks, signature: ' Rowan ' });
    const forecast = { mass: { value: 199, u: 2 }, x: { value: 77, u: 1 }, percentMac: 51 };
    const now = new Date('2026-11-22T09:10:00.000Z');
    const record = recordOf({ draft, account: figuresOf(draft), lines, forecast, gliderVersion: 3, now });
    expect(record).toMatchObject({
      id: draft.id,
      gliderVersion: 3,
      signature: 'Rowan',
      range: { basis: 'plan' },
    });
    expect(record.checks.map(({ words }) => words)).toEqual(lines.map(({ words }) => words));
    expect(record.signedAt).toBe('2026-11-22T09:10:00.000Z');
  });
});
