import { describe, expect, it } from 'vitest';
import { bestOf, bestTrades, sentenceOf, stepOf, wholeSentence } from '#client/features/trial/headline.ts';
import { pointLabels } from '#client/features/trial/point-labels.ts';
import type { TrialResult } from '#shared/core/wood-trial.ts';
import { USUAL_UNITS } from '#shared/format/units.ts';

const result = (
  name: string,
  bare: number,
  allUp: number | null,
  margin: number | null = null,
): TrialResult => ({
  name,
  bare,
  allUp,
  margin,
  marginAt: margin === null ? null : 0,
  wingMass: 0,
  wingBare: 0,
  u: 0,
  x: null,
  percentMac: null,
  wingLoading: null,
  classLoading: null,
  ballast: allUp === null ? null : allUp - bare,
  added: allUp === null ? null : 0,
  refused: allUp === null ? { refused: 'wrong_side', takeOff: 1 } : null,
});
const said = (from: TrialResult, to: TrialResult) =>
  wholeSentence(sentenceOf(to.name, stepOf(from, to), USUAL_UNITS)).replaceAll('\u202f', ' ');

describe('the sentence of two trials', () => {
  const drawn = result('As drawn', 100, 120, 2.6);

  it('tells what is saved, what is left of it after the nose weight, and what becomes of the spar', () => {
    expect(said(drawn, result('Light ribs', 96.9, 116, 2.6))).toBe(
      'Light ribs: saves 3.1 g; after re-trim 4.0 g; spar margin unchanged at 2.60',
    );
    expect(said(drawn, result('Light spars', 97, 116, 1.9))).toBe(
      'Light spars: saves 3.0 g; after re-trim 4.0 g; spar margin 1.90 instead of 2.60',
    );
  });

  it('says so when a saving is eaten by ballast, when nothing changes, and when it cannot be trimmed', () => {
    const plain = result('As drawn', 100, 120);
    expect(said(plain, result('Light nose', 98, 123))).toBe(
      'Light nose: saves 2.0 g; after re-trim 3.0 g more',
    );
    expect(said(plain, result('Heavy nose', 102, 118))).toBe(
      'Heavy nose: costs 2.0 g; after re-trim 2.0 g saved',
    );
    expect(said(plain, result('Same', 100, 120))).toBe('Same: no difference in mass');
    expect(said(plain, result('Heavy', 104, null))).toBe(
      'Heavy: costs 4.0 g, but it cannot be trimmed at this arm',
    );
  });

  it('opens with the trial that saves most once trimmed', () => {
    expect(bestOf([drawn, result('a', 96, 116), result('b', 99, 112), result('c', 90, null)])).toBe(2);
    expect(bestOf([drawn])).toBe(0);
    expect(bestOf([drawn, result('dearer', 104, 125)])).toBe(1);
  });
});

describe('the best trades', () => {
  it('are those that nothing beats in both, a difference that is not told being none', () => {
    const rows = [
      result('As drawn', 0, 120, 2.601),
      result('Light ribs', 0, 118, 2.599),
      result('Light spars', 0, 116, 1.9),
      result('Worse', 0, 117, 1.8),
      result('Stuck', 0, null),
    ];
    expect(bestTrades(rows)).toEqual([false, true, true, false, false]);
  });
});

describe('names of points on the plot', () => {
  it('never lie over one another and stay in the frame', () => {
    const points = Array.from({ length: 12 }, (_, i) => ({
      x: 300 + i,
      y: 254.9 + (i % 3) / 7,
      name: `Trial ${i + 1}`,
    }));
    const labels = pointLabels(points, 360);
    for (const [i, a] of labels.entries()) {
      const wide = points[i]!.name.length * 6.4;
      expect(a.textAnchor === 'start' ? a.x + wide : a.x).toBeLessThanOrEqual(360);
      for (const b of labels.slice(i + 1)) {
        if (a.textAnchor === b.textAnchor) expect(Math.abs(a.y - b.y)).toBeGreaterThan(15.9);
      }
    }
  });
});
