// @vitest-environment happy-dom
import { beforeEach, describe, expect, it } from 'vitest';
import { draftShelf } from '#client/features/gliders/drafts.ts';
import { planNamed } from './plans.ts';

const draft = (name: string, at: string) => ({
  version: 3,
  plan: planNamed(name),
  base: planNamed('base'),
  sent: null,
  at,
});
const shelf = (page: string, user = 'ines', glider = 'g1') => draftShelf(glider, user, localStorage, page);

beforeEach(() => localStorage.clear());

describe('drafts', () => {
  it('come back after a reload, when the window has another name', () => {
    shelf('p1').put(draft('a', '1'));
    expect(shelf('p2').take()?.plan.name).toBe('a');
  });

  it('of two windows do not overwrite each other; the newest is taken first', () => {
    shelf('p1').put(draft('older', '1'));
    shelf('p2').put(draft('newer', '2'));
    const third = shelf('p3');
    expect(third.take()?.plan.name).toBe('newer');
    third.clear();
    expect(third.take()?.plan.name).toBe('older');
  });

  it('are not shown to somebody else, nor for another glider', () => {
    shelf('p1').put(draft('a', '1'));
    expect([shelf('p1', 'odile').take(), shelf('p1', 'ines', 'g2').take()]).toEqual([null, null]);
  });

  it('that cannot be read are passed over', () => {
    localStorage.setItem('featherbeam.draft.ines.g1.p1', '{"version":3,"plan":');
    expect(shelf('p2').take()).toBeNull();
  });

  it('are kept without what they were made on where there is no room for both', () => {
    const small: Pick<Storage, 'setItem'> = {
      setItem: (key: string, text: string) => {
        if (text.includes('"name":"base"')) throw new DOMException('full', 'QuotaExceededError');
        localStorage.setItem(key, text);
      },
    };
    draftShelf('g1', 'ines', small as Storage, 'p1').put(draft('a', '1'));
    expect(shelf('p2').take()).toMatchObject({ plan: { name: 'a' }, base: null });
  });
});
