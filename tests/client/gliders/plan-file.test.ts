import { describe, expect, it } from 'vitest';
import { copyName, fileName, readPlan } from '#client/features/gliders/plan-file.ts';
import { planNamed } from './plans.ts';

describe('importing a plan', () => {
  it('takes back what was downloaded', () => {
    expect(readPlan(JSON.stringify(planNamed('Plover')))).toEqual({ plan: planNamed('Plover') });
  });

  it('takes the plan out of a document that carries it', () => {
    expect(readPlan(JSON.stringify({ number: 3, plan: planNamed('Plover') }))).toEqual({
      plan: planNamed('Plover'),
    });
  });

  it('tells every fault at once, each with its place in words', () => {
    const plan = planNamed('');
    const [wing] = plan.surfaces;
    if (wing?.panels[0]) wing.panels[0].rootChord = -150;
    expect(readPlan(JSON.stringify(plan))).toEqual({
      problems: ['Name: Must not be empty.', 'Wing, panel 1, root chord: Must be more than 0 mm.'],
    });
  });

  it.each(['', '{"a":', '[]', '7', 'null'])('refuses %j with a sentence', (text) => {
    const read = readPlan(text);
    expect('problems' in read && read.problems).toHaveLength(1);
  });

  it('survives a plan of a strange shape', () => {
    expect(readPlan('{"surfaces":[{"parts":{"0":null}}],"items":7}')).toHaveProperty('problems');
  });
});

describe('names', () => {
  it('of copies are not taken twice', () => {
    expect(copyName('Dunlin', ['Dunlin'])).toBe('Dunlin copy');
    expect(copyName('Dunlin copy', ['Dunlin', 'Dunlin copy'])).toBe('Dunlin copy 2');
  });

  it('of files hold only what every file system takes', () => {
    expect([fileName('Größe 3/4: “Plover”'), fileName('///')]).toEqual(['Gro-e-3-4-Plover', 'plan']);
  });
});
