import { describe, expect, it } from 'vitest';
import { changed, overtaken, redone, startHistory, undone } from '#client/features/gliders/history.ts';

/** A sum, on which every change is a difference: made on another sum, it is still that difference. */
const add = (from: number, to: number, onto: number) => onto + to - from;
const back = (history: ReturnType<typeof startHistory<number>>) => undone(history, add);
const again = (history: ReturnType<typeof startHistory<number>>) => redone(history, add);

describe('history', () => {
  it('takes quick repeats of one change back together', () => {
    let history = startHistory(1);
    history = changed(history, 2, 'span', 0);
    history = changed(history, 3, 'span', 500);
    expect(back(history).present).toBe(1);
  });

  it('keeps slow repeats, and quick changes of different things, apart', () => {
    const slow = changed(changed(startHistory(1), 2, 'span', 0), 3, 'span', 5000);
    const different = changed(changed(startHistory(1), 2, 'span', 0), 3, 'chord', 100);
    expect([back(slow).present, back(different).present]).toEqual([2, 2]);
  });

  it('brings back what was taken back, until something new is done', () => {
    const taken = back(changed(startHistory(1), 2, 'span', 0));
    expect(again(taken).present).toBe(2);
    expect(again(changed(taken, 7, 'span', 9000)).present).toBe(7);
  });

  it('does not join a change to one that was taken back', () => {
    const taken = back(changed(changed(startHistory(1), 2, 'a', 0), 3, 'span', 5000));
    expect(back(changed(taken, 4, 'span', 5100)).present).toBe(2);
  });

  it('stays where it is at either end', () => {
    const history = startHistory(1);
    expect([back(history), again(history)]).toEqual([history, history]);
  });

  it('takes back only its own changes where something else changed the state in between', () => {
    const mine = changed(changed(startHistory(1), 3, 'a', 0), 10, 'b', 9000);
    const joined = overtaken(mine, 110);
    const once = back(joined);
    expect([once.present, back(once).present]).toEqual([103, 101]);
    expect(again(again(back(once))).present).toBe(110);
  });

  it('passes over a step that has nothing left to take back', () => {
    const settled = (from: number, to: number, onto: number) => (onto === 50 ? onto : add(from, to, onto));
    const joined = overtaken(changed(startHistory(1), 3, 'a', 0), 50);
    expect(undone(joined, settled)).toMatchObject({ present: 50, past: [], future: [] });
  });

  it('does not join a change to one from before something else came in', () => {
    const joined = overtaken(changed(startHistory(1), 2, 'span', 0), 12);
    expect(back(changed(joined, 13, 'span', 100)).present).toBe(12);
  });
});
