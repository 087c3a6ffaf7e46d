import { describe, expect, it } from 'vitest';
import { reduce, startDesk, type DeskEvent } from '#client/features/gliders/autosave.ts';
import { isDirty, isSendable, saveStateOf, type Desk } from '#client/features/gliders/desk-state.ts';
import type { Plan } from '#shared/core/plan.ts';
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
  const choosing = (choice: 'mine' | 'theirs'): DeskEvent => ({
    type: 'decided',
    choices: new Map(conflict.conflicts.map(({ id }) => [id, choice])),
    at: 0,
  });

  it('keeps both states and sends nothing until each line is chosen', () => {
    expect([saveStateOf(conflict), isSendable(conflict)]).toEqual(['conflict', false]);
    expect(conflict.conflicts).toMatchObject([{ field: 'name', mine: [{ to: 'Plover, mine' }] }]);
    expect([conflict.history.present.name, conflict.theirs?.plan.name]).toEqual([
      'Plover, mine',
      'Plover, theirs',
    ]);
    expect(run(conflict, { type: 'decided', choices: new Map(), at: 0 })).toBe(conflict);
  });

  it('is settled for mine by sending it over their version', () => {
    const desk = run(conflict, choosing('mine'));
    expect([desk.base.version, desk.history.present.name, isSendable(desk)]).toEqual([
      4,
      'Plover, mine',
      true,
    ]);
  });

  it('is settled for theirs without losing mine, which an undo brings back', () => {
    const desk = run(conflict, choosing('theirs'));
    expect([desk.history.present.name, saveStateOf(desk)]).toEqual(['Plover, theirs', 'saved']);
    expect(run(desk, { type: 'undone' }).history.present.name).toBe('Plover, mine');
  });

  it('is no question any more once the edit that collided is taken back', () => {
    const desk = run(conflict, { type: 'undone' });
    expect([saveStateOf(desk), desk.history.present.name]).toEqual(['saved', 'Plover, theirs']);
  });

  it('goes on asking where an edit collides with the state that is waited for', () => {
    const more = run(conflict, edited('Plover, mine too', 9000));
    expect([saveStateOf(more), more.conflicts]).toMatchObject([
      'conflict',
      [{ mine: [{ to: 'Plover, mine too' }] }],
    ]);
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

describe('a newer version that collides with nothing', () => {
  const weight = { id: 'lead', name: 'Lead', group: 'ballast', mass: 20, at: [-120, 0, 0] } as const;
  const longer: Plan = { ...planNamed('Plover'), items: [{ ...weight, at: [...weight.at] }] };
  const current = keptAt(4, longer, 'Odile');
  const joined = run(clean, edited('Plover II'), { type: 'sent' }, { type: 'outdated', current });

  it('is joined with the edits, said in a line, and sent over it', () => {
    expect(joined.history.present).toMatchObject({ name: 'Plover II', items: [{ id: 'lead' }] });
    expect([joined.base.version, isSendable(joined)]).toEqual([4, true]);
    expect(joined.news).toMatchObject({ by: 'Odile', changes: [{ path: 'items/lead', from: null }] });
    expect(run(joined, { type: 'newsRead' }).news).toBeNull();
  });

  it('is left alone by an undo of what was edited here', () => {
    const desk = run(joined, { type: 'undone' });
    expect([desk.history.present, saveStateOf(desk)]).toEqual([longer, 'saved']);
    expect(run(desk, { type: 'redone' }).history.present).toEqual(joined.history.present);
  });

  it('is taken in while nothing was edited, and is no step that an undo could take back', () => {
    const desk = run(clean, { type: 'refreshed', kept: current });
    expect([desk.history.present, saveStateOf(desk), desk.history.past]).toEqual([longer, 'saved', []]);
  });

  it('adds up in one line until it is read', () => {
    const next = keptAt(5, { ...longer, name: 'Plover III' }, 'Odile');
    const desk = run(clean, { type: 'refreshed', kept: current }, { type: 'refreshed', kept: next });
    expect(desk.news?.changes.map(({ path }) => path)).toEqual(['items/lead', '']);
  });
});

describe('news from the server', () => {
  it('ask where unsent edits changed the same, and never replace them', () => {
    const desk = run(clean, edited('mine'), { type: 'refreshed', kept: theirs });
    expect([desk.history.present.name, saveStateOf(desk)]).toEqual(['mine', 'conflict']);
  });

  it('wait for the answer of a save that is on its way', () => {
    const sending = run(clean, edited('mine'), { type: 'sent' });
    expect(run(sending, { type: 'refreshed', kept: theirs })).toBe(sending);
  });

  it('that are older than what is known change nothing', () => {
    expect(run(clean, { type: 'refreshed', kept: keptAt(2, planNamed('old')) })).toBe(clean);
  });
});

describe('bringing an older state back', () => {
  const back = keptAt(4, planNamed('Plover I'));

  it('is a step that an undo takes back', () => {
    const desk = run(clean, { type: 'sent' }, { type: 'broughtBack', kept: back, at: 0 });
    expect([desk.history.present.name, saveStateOf(desk), desk.base.version]).toEqual([
      'Plover I',
      'saved',
      4,
    ]);
    expect(run(desk, { type: 'undone' }).history.present.name).toBe('Plover');
  });

  it('leaves what was typed in the meantime on top', () => {
    const recipe = (plan: Plan): Plan => ({ ...plan, target: { percentMac: 40, tolerance: 2 } });
    const typing: DeskEvent = { type: 'edited', recipe, what: 'target', at: 0 };
    const desk = run(clean, { type: 'sent' }, typing, { type: 'broughtBack', kept: back, at: 0 });
    expect(desk.history.present).toMatchObject({ name: 'Plover I', target: { percentMac: 40 } });
    expect(isSendable(desk)).toBe(true);
  });
});

describe('opening with unsent edits', () => {
  const draft = {
    version: 3,
    plan: planNamed('mine'),
    base: kept.plan,
    sent: null,
    at: '2026-11-30T11:00:00.000Z',
  };

  it('puts them back over the version they were made on', () => {
    const desk = startDesk(kept, draft);
    expect([desk.history.present.name, isSendable(desk), desk.restored?.over.name]).toEqual([
      'mine',
      true,
      'Plover',
    ]);
  });

  it('joins them with what somebody saved in between', () => {
    const target = { percentMac: 40, tolerance: 2 };
    const desk = startDesk(keptAt(4, { ...kept.plan, target }, 'Odile'), draft);
    expect(desk.history.present).toMatchObject({ name: 'mine', target });
    expect([isSendable(desk), desk.base.version, desk.news?.by]).toEqual([true, 4, 'Odile']);
  });

  it('asks for whatever differs where it is not known what they were made on', () => {
    const desk = startDesk(keptAt(4, planNamed('Plover')), { ...draft, base: null });
    expect([saveStateOf(desk), desk.conflicts.map(({ path }) => path)]).toEqual(['conflict', ['']]);
  });

  it('asks when somebody saved the same in between', () => {
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

  it('goes on with the steps of this window, reload or not', () => {
    const before = run(clean, edited('a'), edited('mine', 9000), { type: 'undone' });
    const trail = structuredClone(before.history);
    const desk = startDesk(kept, { ...draft, plan: planNamed('a') }, trail);
    expect(run(desk, { type: 'redone' }).history.present.name).toBe('mine');
    expect(run(desk, { type: 'undone' }).history.present.name).toBe('Plover');
  });

  it('forgets them when they have arrived whole', () => {
    const desk = startDesk(keptAt(4, planNamed('mine')), draft);
    expect([isDirty(desk), desk.restored]).toEqual([false, null]);
  });
});
