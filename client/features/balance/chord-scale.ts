import { percentOfMac } from '#shared/core/balance.ts';
import type { Beam } from '#shared/core/beam.ts';
import { spreadLabels } from '#shared/core/ruler.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';

export interface ChordScale {
  /** ends of the scale, % MAC; the chord's own 0 and 100 unless something lies beyond */
  from: number;
  to: number;
  toX: (percent: number) => number;
  percent: { balance: number | null; wanted: number | null; neutralPoint: number | null };
  range: [number, number] | null;
}

export interface ChordLabel {
  key: string;
  text: string;
  /** the mark that it names */
  x: number;
  /** where the label itself stands */
  at: number;
  tone: string;
  strong: boolean;
}

const SIDE = 26;
const LETTER = 6.9;

/** A scale in % of the chord across a width; null without a chord. */
export function chordScale({ chord, balance, wanted, neutralPoint }: Beam, width: number): ChordScale | null {
  if (!chord) return null;
  const percentOf = (x: number) => percentOfMac(x, chord.from, chord.to - chord.from);
  const percent = {
    balance: balance.percentMac,
    wanted: wanted?.percentMac ?? null,
    neutralPoint: neutralPoint === null ? null : percentOf(neutralPoint),
  };
  const range: [number, number] | null = wanted && [percentOf(wanted.from), percentOf(wanted.to)];
  const all = [0, 100, ...Object.values(percent), ...(range ?? [])].filter((value) => value !== null);
  const from = Math.floor(Math.min(...all) / 10) * 10;
  const to = Math.ceil(Math.max(...all) / 10) * 10;
  const perPercent = (width - 2 * SIDE) / (to - from);
  return { from, to, toX: (value) => SIDE + (value - from) * perPercent, percent, range };
}

/** What the marks say, side by side without touching. */
export function chordLabels({ percent, toX }: ChordScale, width: number, outside: boolean): ChordLabel[] {
  const say = (word: string, value: number) => `${word} ${formatNumber(value, 1)}${NARROW_SPACE}%`;
  const { wanted, balance, neutralPoint } = percent;
  const labels: Omit<ChordLabel, 'at'>[] = [];
  const add = (key: string, word: string, value: number | null, tone: string, strong: boolean) => {
    if (value !== null) labels.push({ key, text: say(word, value), x: toX(value), tone, strong });
  };
  add('wanted', 'wanted', wanted, 'var(--ink)', true);
  add('balance', 'balances', balance, outside ? 'var(--red)' : 'var(--pencil)', true);
  add('neutral', 'neutral', neutralPoint, 'var(--graphite)', false);
  const centres = spreadLabels(
    labels.map(({ x, text }) => ({ x, width: text.length * LETTER + 10 })),
    0,
    width,
  );
  return labels.map((label, i) => ({ ...label, at: centres[i] ?? label.x }));
}
