import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import { estimate as estimateSchema } from '#shared/schemas/estimate.ts';
import { demoPlan, DEMO_NAMES, planOf, wingOf } from '#tests/support/plans.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { smallPlan } from '../support/rows.ts';

const app = useApp();
const post = (body: object) => app.visitor().post('/api/estimates').send(body);
const detailsOf = async (body: object) =>
  expectProblem(await post(body), 'invalid_input').errors?.map(({ detail }) => detail) ?? [];

describe('POST /api/estimates', () => {
  it('answers a visitor with exactly the fields of the contract, and keeps nothing', async () => {
    const before = await countRows();
    const res = await post({ plan: smallPlan() }).expect(200);
    expect(Object.keys(res.body)).toEqual([
      'planform',
      'lines',
      'totals',
      'balance',
      'loading',
      'speeds',
      'spar',
      'notices',
    ]);
    expect(estimateSchema.parse(res.body).lines.map(({ id }) => id)).toEqual([
      'wing/ribs',
      'wing/spar',
      'item/nose',
    ]);
    expect(changes(before, await countRows())).toEqual({});
  });

  it.each(DEMO_NAMES)('answers %s with the very figures that the browser computes', async (name) => {
    const plan = demoPlan(name);
    const res = await post({ plan }).expect(200);
    expect(res.body).toEqual(JSON.parse(JSON.stringify(estimate(plan))));
  });

  it('names every wrong field at once', async () => {
    const plan = {
      ...smallPlan(),
      name: '',
      surfaces: [
        {
          ...wingOf([]),
          panels: [{ ...wingOf([]).panels[0], rootChord: -150, tipChord: 'wide' }],
          parts: [
            { id: 'r', name: 'R', kind: 'ribs', material: 'gold', count: 2, thickness: 1, lightening: 2 },
          ],
        },
      ],
      items: [{ id: 'i', name: 'I', group: 'gear', mass: '', at: [0, 0] }],
    };
    expect(refusedFields(await post({ plan }))).toEqual([
      '#/plan/items/0/at',
      '#/plan/items/0/mass',
      '#/plan/name',
      '#/plan/surfaces/0/panels/0/rootChord',
      '#/plan/surfaces/0/panels/0/tipChord',
      '#/plan/surfaces/0/parts/0/from',
      '#/plan/surfaces/0/parts/0/lightening',
      '#/plan/surfaces/0/parts/0/material',
      '#/plan/surfaces/0/parts/0/to',
    ]);
  });

  it('says what is wrong in words', async () => {
    const panel = { ...wingOf([]).panels[0], rootChord: -150, span: 'long' };
    const surfaces = [{ ...wingOf([]), panels: [panel], role: 'sail' }];
    expect(await detailsOf({ plan: { ...smallPlan(), surfaces } })).toEqual([
      'Must be one of wing, tailplane, fin.',
      'Must be a number.',
      'Must be more than 0 mm.',
    ]);
    expect(await detailsOf({})).toEqual(['Is missing.']);
    expect(await detailsOf({ plan: planOf([], { name: 'x\0y' }) })).toEqual([
      'Has a character that is not text.',
    ]);
  });

  it('refuses 100,000 parts with one sentence about their number', async () => {
    const parts = Array.from({ length: 100_000 }, () => ({}));
    const plan = { ...smallPlan(), surfaces: [{ ...wingOf([]), parts }] };
    const { errors } = expectProblem(await post({ plan }), 'invalid_input');
    expect(errors).toEqual([
      { pointer: '#/plan/surfaces/0/parts', detail: 'Must have at most 4000 entries, not 100000.' },
    ]);
  });

  it('takes 2,000 parts', async () => {
    const parts = Array.from({ length: 2_000 }, (_, i) => ({
      id: `part-${i}`,
      name: 'Sheet',
      kind: 'sheet' as const,
      material: 'balsa',
      thickness: 1,
      cutout: 0.5,
    }));
    const res = await post({ plan: planOf([wingOf(parts)]) }).expect(200);
    expect(res.body.lines).toHaveLength(2_000);
  });

  it('refuses a body of 10 MB and goes on answering', async () => {
    expectProblem(await post({ plan: 'x'.repeat(10_000_000) }), 'too_large');
    await post({ plan: smallPlan() }).expect(200);
  });

  it('refuses a body nested a thousand deep', async () => {
    const deep = `${'{"a":'.repeat(1_000)}1${'}'.repeat(1_000)}`;
    const res = await app.visitor().post('/api/estimates').type('json').send(deep);
    expect(expectProblem(res, 'invalid_input').errors).toHaveLength(1);
  });

  it('answers no more errors than anybody can read', async () => {
    const items = Array.from({ length: 900 }, () => ({}));
    const solids = items.map(() => ({ shape: 'bar' }));
    const { errors } = expectProblem(
      await post({ plan: { ...smallPlan(), items, solids } }),
      'invalid_input',
    );
    expect(errors).toHaveLength(1_001);
    expect(errors?.at(-1)?.detail).toMatch(/^\d+ more fields are wrong\.$/);
  });

  it('sums a group whose name is a word of the language', async () => {
    const item = {
      id: 'i',
      name: 'I',
      group: 'constructor',
      mass: 3,
      at: [0, 0, 0] as [number, number, number],
    };
    const res = await post({ plan: planOf([], { items: [item] }) }).expect(200);
    expect(res.body.totals.byGroup).toEqual({ constructor: 3 });
  });

  it('takes “__proto__” for no material, even where the plan lists one', async () => {
    const sheet = { id: 's', name: 'S', kind: 'sheet', material: '__proto__', thickness: 1, cutout: 0 };
    const plan = JSON.stringify({ plan: { ...smallPlan(), surfaces: [{ ...wingOf([]), parts: [sheet] }] } });
    const balsa = JSON.stringify(smallPlan().materials['balsa']);
    const body = plan.replace('"materials":{', `"materials":{"__proto__":${balsa},`);
    const res = await app.visitor().post('/api/estimates').type('json').send(body);
    expect(refusedFields(res)).toEqual(['#/plan/surfaces/0/parts/0/material']);
  });
});
