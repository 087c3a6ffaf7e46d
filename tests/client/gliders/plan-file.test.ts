import { describe, expect, it } from 'vitest';
import { readPlans } from '#client/features/gliders/plan-file.ts';
import { fileName } from '#client/lib/save-file.ts';
import { planNamed } from './plans.ts';

describe('importing a plan', () => {
  it('takes back what was downloaded', () => {
    expect(readPlans(JSON.stringify(planNamed('Plover')))).toEqual({
      plans: [planNamed('Plover')],
    });
  });

  it('takes several plans as the bench exports them, all of them or none', () => {
    const two = [planNamed('Plover'), planNamed('Dunlin')];
    expect(readPlans(JSON.stringify({ plans: two }))).toEqual({ plans: two });
    expect(readPlans(JSON.stringify({ plans: [...two, planNamed('')] }))).toEqual({
      problems: ['Plan 3: Name: Must not be empty.'],
    });
    expect(readPlans('{"plans":[]}')).toEqual({ problems: ['The file holds no plan.'] });
  });

  it('takes the plan out of a document that carries it', () => {
    expect(readPlans(JSON.stringify({ number: 3, plan: planNamed('Plover') }))).toEqual({
      plans: [planNamed('Plover')],
    });
  });

  it('tells every fault at once, each with its place in words', () => {
    const plan = planNamed('');
    const [wing] = plan.surfaces;
    if (wing?.panels[0]) wing.panels[0].rootChord = -150;
    expect(readPlans(JSON.stringify(plan))).toEqual({
      problems: ['Name: Must not be empty.', 'Wing, panel 1, root chord: Must be more than 0 mm.'],
    });
  });

  it.each(['', '{"a":', '[]', '7', 'null'])('refuses %j with a sentence', (text) => {
    const read = readPlans(text);
    expect('problems' in read && read.problems).toHaveLength(1);
  });

  it('survives a plan of a strange shape', () => {
    expect(readPlans('{"surfaces":[{"parts":{"0":null}}],"items":7}')).toHaveProperty('problems');
  });
});

describe('names', () => {
  it('of files hold only what every file system takes', () => {
    expect([fileName('Größe 3/4: “Plover”'), fileName('///')]).toEqual(['Gro-e-3-4-Plover', 'plan']);
  });
});
