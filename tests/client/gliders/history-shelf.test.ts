// @vitest-environment happy-dom
import { beforeEach, describe, expect, it } from 'vitest';
import { changed, startHistory, undone, type History } from '#client/features/gliders/history.ts';
import { trailShelf } from '#client/features/gliders/history-shelf.ts';
import type { Plan } from '#shared/core/plan.ts';
import { naming, planNamed } from './plans.ts';

const never = (_: Plan, __: Plan, onto: Plan) => onto;
const named = (count: number): History<Plan> => {
  let history = startHistory(planNamed('0'));
  for (let i = 1; i <= count; i++) {
    history = changed(history, naming(String(i))(history.present), 'name', i * 10_000);
  }
  return history;
};
const names = ({ past, present, future }: Pick<History<Plan>, 'past' | 'present' | 'future'>) => [
  ...past.map(({ before }) => before.name),
  present.name,
  ...future.map(({ after }) => after.name),
];

beforeEach(() => sessionStorage.clear());

describe('steps on the shelf', () => {
  it('come back after a reload, those taken back too', () => {
    const history = undone(undone(named(6), never), never);
    trailShelf('ines.g1').put(history);
    const taken = trailShelf('ines.g1').take();
    expect(taken && names(taken)).toEqual(names(history));
    expect(taken?.past.at(-1)?.before).toEqual(history.past.at(-1)?.before);
  });

  it('lead from one to the next without a gap, so that an undo is the very plan there was', () => {
    trailShelf('ines.g1').put(named(4));
    const taken = trailShelf('ines.g1').take();
    const past = taken?.past ?? [];
    expect(past).toHaveLength(4);
    past.forEach(({ after }, i) => expect(after).toBe(past[i + 1]?.before ?? taken?.present));
  });

  it('take little room: what changed, not the plan again', () => {
    trailShelf('ines.g1').put(named(1));
    const one = sessionStorage.getItem('featherbeam.steps.ines.g1')?.length ?? 0;
    trailShelf('ines.g1').put(named(101));
    expect(sessionStorage.getItem('featherbeam.steps.ines.g1')?.length).toBeLessThan(one + 100 * 200);
  });

  it('give up the oldest where there is no room for all', () => {
    const room = JSON.stringify(planNamed('0')).length + 400;
    trailShelf('ines.g1', sessionStorage, room).put(named(50));
    const taken = trailShelf('ines.g1').take();
    expect(sessionStorage.getItem('featherbeam.steps.ines.g1')?.length).toBeLessThan(room + 40);
    expect(taken?.past.length).toBeGreaterThan(0);
    expect(taken?.past.length).toBeLessThan(50);
    expect(taken?.past.at(-1)?.before.name).toBe('49');
  });

  it('are not taken for another glider or person, nor when they cannot be read', () => {
    trailShelf('ines.g1').put(named(2));
    sessionStorage.setItem('featherbeam.steps.ines.g3', '{"present":{}}');
    expect([
      trailShelf('ines.g2').take(),
      trailShelf('odile.g1').take(),
      trailShelf('ines.g3').take(),
    ]).toEqual([null, null, null]);
  });
});
