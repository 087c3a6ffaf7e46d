import { describe, expect, it } from 'vitest';
import {
  BENCH_ORDERS,
  paramsOf,
  sortedBy,
  viewOf,
  type BenchView,
} from '#client/features/gliders/bench-view.ts';

const usual: BenchView = { search: '', sort: 'changed', direction: 'down', archived: 'no' };

describe('the view of the bench in its address', () => {
  it('is the usual one where nothing is said, and says nothing of it', () => {
    expect(viewOf(new URLSearchParams())).toEqual(usual);
    expect(paramsOf(usual).toString()).toBe('');
  });

  it('comes back as it was written, for every order', () => {
    for (const { sort, direction } of BENCH_ORDERS) {
      const view: BenchView = { search: 'möwe & co', sort, direction, archived: 'only' };
      expect(viewOf(paramsOf(view))).toEqual(view);
    }
  });

  it('takes nonsense for the usual view', () => {
    expect(viewOf(new URLSearchParams('sort=colour&direction=sideways&archived=yes'))).toEqual(usual);
  });
});

describe('a press on a heading', () => {
  it('sorts names from A and masses from the lightest', () => {
    expect(sortedBy(usual, 'name')).toMatchObject({ sort: 'name', direction: 'up' });
    expect(sortedBy(usual, 'mass')).toMatchObject({ sort: 'mass', direction: 'up' });
  });

  it('turns the order round the second time', () => {
    expect(sortedBy(sortedBy(usual, 'name'), 'name').direction).toBe('down');
    expect(sortedBy(usual, 'changed').direction).toBe('up');
  });
});
