import { describe, expect, it } from 'vitest';
import { changed, redone, startHistory, undone } from '#client/features/gliders/history.ts';

describe('history', () => {
  it('takes quick repeats of one change back together', () => {
    let history = startHistory(1);
    history = changed(history, 2, 'span', 0);
    history = changed(history, 3, 'span', 500);
    expect(undone(history).present).toBe(1);
  });

  it('keeps slow repeats, and quick changes of different things, apart', () => {
    const slow = changed(changed(startHistory(1), 2, 'span', 0), 3, 'span', 5000);
    const different = changed(changed(startHistory(1), 2, 'span', 0), 3, 'chord', 100);
    expect([undone(slow).present, undone(different).present]).toEqual([2, 2]);
  });

  it('brings back what was taken back, until something new is done', () => {
    const back = undone(changed(startHistory(1), 2, 'span', 0));
    expect(redone(back).present).toBe(2);
    expect(redone(changed(back, 7, 'span', 9000)).present).toBe(7);
  });

  it('does not join a change to one that was taken back', () => {
    const back = undone(changed(changed(startHistory(1), 2, 'a', 0), 3, 'span', 5000));
    expect(undone(changed(back, 4, 'span', 5100)).present).toBe(2);
  });

  it('stays where it is at either end', () => {
    const history = startHistory(1);
    expect([undone(history), redone(history)]).toEqual([history, history]);
  });
});
