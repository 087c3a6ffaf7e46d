import { describe, expect, it } from 'vitest';
import {
  isDirty,
  isSendable,
  reduce,
  saveStateOf,
  startDesk,
  type Desk,
  type DeskEvent,
} from '#client/features/gliders/autosave.ts';
import { keptAt, naming, planNamed } from './plans.ts';

const kept = keptAt(3, planNamed('Plover'));
const edited = (name: string, at = 0): DeskEvent => ({
  type: 'edited',
  recipe: naming(name),
  what: name,
  at,
});
const run = (desk: Desk, ...events: DeskEvent[]) => events.reduce(reduce, desk);
const clean = startDesk(kept, null);
const broken: DeskEvent = {
  type: 'failed',
  passing: true,
  offline: true,
  signedOut: false,
  problem: 'no line',
};
const theirs = keptAt(4, planNamed('Plover, theirs'), 'Odile');

describe('the desk', () => {
  it('is saved until something is changed, and again once that is acknowledged', () => {
    const dirty = run(clean, edited('Plover II'));
    expect([saveStateOf(clean), saveStateOf(dirty)]).toEqual(['saved', 'unsaved']);
    const sent = run(dirty, { type: 'sent' });
    expect(saveStateOf(sent)).toBe('saving');
    const done = run(sent, { type: 'acknowledged', kept: keptAt(4, planNamed('Plover II')) });
    expect([saveStateOf(done), done.base.version]).toEqual(['saved', 4]);
  });

  it('still has to send what was typed while a save was on its way', () => {
    const desk = run(clean, edited('a'), { type: 'sent' }, edited('b', 9000), {
      type: 'acknowledged',
      kept: keptAt(4, planNamed('a')),
    });
    expect(desk.history.present.name).toBe('b');
    expect(isSendable(desk)).toBe(true);
  });

  it('sends nothing that is not valid and keeps the last valid plan for the figures', () => {
    const desk = run(clean, edited(''));
    expect([saveStateOf(desk), isSendable(desk), desk.valid.name]).toEqual(['invalid', false, 'Plover']);
    expect(desk.check.issues.get('name')).toBe('Must not be empty.');
  });

  it('waits on a broken line and is not sendable before a retry', () => {
    const desk = run(clean, edited('a'), { type: 'sent' }, broken);
    expect([saveStateOf(desk), isSendable(desk)]).toEqual(['offline', false]);
    expect(isSendable(run(desk, { type: 'retried' }))).toBe(true);
  });
});

describe('a stale version', () => {
  const conflict = run(
    clean,
    edited('Plover, mine'),
    { type: 'sent' },
    { type: 'outdated', current: theirs },
  );

  it('keeps both states and sends nothing until one is chosen', () => {
    expect([saveStateOf(conflict), isSendable(conflict)]).toEqual(['conflict', false]);
    expect([conflict.history.present.name, conflict.theirs?.plan.name]).toEqual([
      'Plover, mine',
      'Plover, theirs',
    ]);
  });

  it('is settled for mine by sending it over their version', () => {
    const desk = run(conflict, { type: 'keptMine' });
    expect([desk.base.version, desk.history.present.name, isSendable(desk)]).toEqual([
      4,
      'Plover, mine',
      true,
    ]);
  });

  it('is settled for theirs without losing mine, which an undo brings back', () => {
    const desk = run(conflict, { type: 'tookTheirs', at: 0 });
    expect([desk.history.present.name, saveStateOf(desk)]).toEqual(['Plover, theirs', 'saved']);
    expect(run(desk, { type: 'undone' }).history.present.name).toBe('Plover, mine');
  });

  it('is none when it is our own save whose answer was lost', () => {
    const current = keptAt(4, planNamed('a'));
    const desk = run(clean, edited('a'), { type: 'sent' }, broken, edited('b', 9000), {
      type: 'outdated',
      current,
    });
    expect([desk.phase, desk.base.version, desk.history.present.name]).toEqual(['idle', 4, 'b']);
  });
});

describe('news from the server', () => {
  it('are laid on a desk where nothing was changed', () => {
    expect(run(clean, { type: 'refreshed', kept: theirs }).history.present.name).toBe('Plover, theirs');
  });

  it('never replace unsent edits', () => {
    const desk = run(clean, edited('mine'), { type: 'refreshed', kept: theirs });
    expect([desk.history.present.name, desk.base.version]).toEqual(['mine', 3]);
  });
});

describe('opening with unsent edits', () => {
  const draft = { version: 3, plan: planNamed('mine'), sent: null, at: '2026-11-30T11:00:00.000Z' };

  it('puts them back over the version they were made on', () => {
    const desk = startDesk(kept, draft);
    expect([desk.history.present.name, isSendable(desk), desk.restored?.over.name]).toEqual([
      'mine',
      true,
      'Plover',
    ]);
  });

  it('asks when somebody saved in between', () => {
    const desk = startDesk(theirs, draft);
    expect([saveStateOf(desk), desk.history.present.name, desk.theirs?.version]).toEqual([
      'conflict',
      'mine',
      4,
    ]);
  });

  it('does not ask when it was our own save that arrived unnoticed', () => {
    const desk = startDesk(keptAt(4, planNamed('a')), { ...draft, sent: planNamed('a') });
    expect([saveStateOf(desk), desk.base.version]).toEqual(['unsaved', 4]);
  });

  it('forgets them when they have arrived whole', () => {
    const desk = startDesk(keptAt(4, planNamed('mine')), draft);
    expect([isDirty(desk), desk.restored]).toEqual([false, null]);
  });
});
