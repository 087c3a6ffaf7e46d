import { describe, expect, it } from 'vitest';
import { countedOf, notedOf } from '#client/lib/built/account.ts';
import { choicesOf, chosen } from '#client/features/as-built/choices.ts';
import { listenToScale, readScaleLine, type ScaleLine } from '#client/features/as-built/serial-scale.ts';
import { heardWords } from '#client/features/as-built/words.ts';
import { asBuilt } from '#shared/core/built/as-built.ts';
import { sidedLines } from '#shared/core/built/sided-lines.ts';
import { unitsOf } from '#shared/format/units.ts';
import type { WeighingDto, WeighingInput } from '#shared/schemas/weighing.ts';
import { demoPlan } from '#tests/support/plans.ts';

const plan = demoPlan('whimbrel');
const choices = choicesOf(plan);
const A = '0b7f8a52-1111-4111-8111-00000000000a';
const plain = (text: string) => text.replaceAll('\u202f', ' ');

const input = (changes: Partial<WeighingInput> = {}): WeighingInput => ({
  title: 'Spar, top, port',
  stage: 'part',
  covers: [{ line: 'wing/spar-top', side: 'port' }],
  values: [6],
  tare: 0,
  resolution: 0.1,
  x: null,
  density: null,
  thickness: null,
  photoId: null,
  note: '',
  gliderVersion: 1,
  weighedAt: '2026-05-02T10:00:00.000Z',
  corrects: null,
  reason: '',
  withdraws: false,
  ...changes,
});
const kept = (id: string, number: number, changes: Partial<WeighingDto> = {}): WeighingDto => ({
  ...input(),
  id,
  number,
  mass: 6,
  u: 0.04,
  weighedBy: 'Ines',
  receivedAt: '2026-05-02T10:00:00.000Z',
  correctedBy: null,
  ...changes,
});

describe('what can be put on the scale', () => {
  it('names everything once, and every code finds its own', () => {
    expect(new Set(choices.map(({ label }) => label)).size).toBe(choices.length);
    for (const choice of choices) {
      expect(chosen(choices, choice.code)).toBe(choice);
      expect(chosen(choices, choice.label.toUpperCase())).toBe(choice);
    }
  });

  it('is found by part of its name where that means one thing, and by nothing where it means several', () => {
    expect(chosen(choices, 'stringer bottom starboard')?.code).toBe('wing/stringer-bottom starboard');
    expect(chosen(choices, 'rib')).toBeNull();
    expect(chosen(choices, '   ')).toBeNull();
    expect(chosen(choices, 'wing bolts')?.code).toBe('item/bolts middle');
  });

  it('holds at each stage what is built by then, and nothing of what comes later', () => {
    const covers = (code: string) =>
      new Set(choices.find((one) => one.code === code)?.covers.map(({ line }) => line));
    expect(covers('wing port framed').has('wing/nose-sheeting')).toBe(false);
    expect(covers('wing port sheeted').has('wing/nose-sheeting')).toBe(true);
    expect(covers('wing port sheeted').has('wing/film')).toBe(false);
    expect(covers('wing port covered').has('wing/film')).toBe(true);
    expect(choices.find(({ code }) => code === 'model')?.covers).toHaveLength(sidedLines(plan).length);
  });
});

describe('weighings that count', () => {
  it('are the latest of each, in the place of the first, with what waits on the device', () => {
    const list = [
      kept('a', 1, { correctedBy: 'c' }),
      kept('b', 2, { mass: 5 }),
      kept('c', 3, { corrects: 'a', mass: 7 }),
    ];
    const record = {
      key: 'd',
      gliderId: 'g',
      kind: 'weighing',
      body: input({ values: [9] }),
      refused: null,
    } as const;
    const noted = notedOf(list, [record]);
    expect(countedOf(noted).map(({ id, mass }) => [id, mass])).toEqual([
      ['c', 7],
      ['b', 5],
      ['d', 9],
    ]);
  });

  it('leave out what was taken back, on the server or on this device', () => {
    const record = {
      key: 'd',
      gliderId: 'g',
      kind: 'weighing',
      body: input({ values: [], corrects: A, reason: 'Wrong part', withdraws: true }),
      refused: null,
    } as const;
    expect(countedOf(notedOf([kept(A, 1)], [record]))).toEqual([]);
  });
});

describe('the account', () => {
  it('is the sum of the readings once every part was weighed', () => {
    const lines = sidedLines(plan);
    const readings = lines.map(({ line, side }, i) => ({
      id: String(i),
      covers: [{ line, side }],
      mass: 1 + i / 7,
      u: 0.03,
    }));
    const { mass, toCome, weighed } = asBuilt(plan, readings);
    const sum = readings.reduce((total, one) => total + one.mass, 0);
    expect(mass).toBeCloseTo(sum, 9);
    expect(weighed).toBeCloseTo(sum, 9);
    expect(toCome).toBeCloseTo(0, 9);
  });

  it('moves no figure but the doubt by a weighing that equals its estimate', () => {
    const before = asBuilt(plan, []);
    const part = before.parts.find(({ line }) => line === 'wing/spar-top')!;
    const after = asBuilt(plan, [{ id: 'a', covers: [part], mass: part.estimated, u: 0.03 }]);
    expect(after.mass).toBeCloseTo(before.mass, 9);
    expect(after.x).toBeCloseTo(before.x ?? Number.NaN, 9);
    expect(after.percentMac).toBeCloseTo(before.percentMac ?? Number.NaN, 9);
    for (const [i, one] of after.parts.entries())
      expect(one.mass).toBeCloseTo(before.parts[i]?.mass ?? Number.NaN, 9);
    expect(after.u).toBeLessThan(before.u);
  });

  it('is told by how far a weighing lies from what was expected', () => {
    const units = unitsOf({});
    const words = (measured: number) => plain(heardWords({ expected: 6, uExpected: 0.6, measured }, units));
    expect(words(6.1)).toBe('as the 6.0 g expected');
    expect(words(6.9)).toBe('0.9 g over the 6.0 g expected');
    expect(words(4)).toBe('2.0 g under the 6.0 g expected, more than wood’s usual spread: look at it');
  });
});

describe('a scale on a cable', () => {
  it.each([
    ['ST,GS,+   12.34 g', 12.34, true],
    ['US,GS,+   12.30 g', 12.3, false],
    ['  3.1 g S', 3.1, true],
    ['S S     20.05 g', 20.05, true],
    ['S D     20.01 g', 20.01, null],
    ['-0.5g', -0.5, null],
    ['0,450 kg', 450, null],
    ['   1.5 oz ?', 42.5242846875, false],
    ['12.3', 12.3, null],
  ])('is read from %j', (line, mass, stable) => {
    const read = readScaleLine(line);
    expect(read?.mass).toBeCloseTo(mass, 9);
    if (stable !== null) expect(read?.stable).toBe(stable);
  });

  it.each(['', 'OVERLOAD', 'ST,GS', '---'])('is not read from %j', (line) => {
    expect(readScaleLine(line)).toBeNull();
  });

  it('is heard line by line, however the line is cut up, until it is let go of', async () => {
    const told: ScaleLine[] = [];
    let push: (text: string) => void = () => undefined;
    let closed = 0;
    const readable = new ReadableStream<Uint8Array>({
      start: (controller) => {
        push = (text) => controller.enqueue(new TextEncoder().encode(text));
      },
    });
    const port = { open: () => Promise.resolve(), close: () => Promise.resolve(void closed++), readable };
    const stop = new AbortController();
    const end = listenToScale(port, (line) => told.push(line), stop.signal);
    push('ST,+  3.');
    push('1 g\r\nST,+  3.2 g\r');
    push('\n');
    await new Promise((resolve) => setTimeout(resolve, 0));
    expect(told.map(({ mass }) => mass)).toEqual([3.1, 3.2]);
    stop.abort();
    await end;
    expect(closed).toBe(1);
  });
});
