import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { firstFlight, firstFlightList } from '#shared/schemas/first-flight.ts';
import { FirstFlight } from '#server/models/first-flight.ts';
import { database } from '#server/services/transaction.ts';
import { useApp } from '../support/app.ts';
import { firstFlightBody } from '../support/built.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { addMember, makeGlider } from '../support/rows.ts';

const app = useApp();

const sign = ({ agent }: Person, gliderId: string, body: object) =>
  agent.post(`/api/gliders/${gliderId}/first-flights`).send(body);
const list = async ({ agent }: Person, gliderId: string) =>
  firstFlightList.parse((await agent.get(`/api/gliders/${gliderId}/first-flights`).expect(200)).body)
    .firstFlights;

async function pilotOfOne() {
  const owner = await makePerson(app);
  const glider = await makeGlider({ owner: owner.user });
  const pilot = await makePerson(app, { name: 'Tobias' });
  await addMember(glider, pilot.user, 'pilot');
  return { owner, pilot, glider };
}

describe('POST /api/gliders/:id/first-flights', () => {
  it('keeps what was signed, with mass and balance worked out from the scales', async () => {
    const { pilot, glider } = await pilotOfOne();
    const before = await countRows();
    const body = firstFlightBody();
    const kept = firstFlight.parse((await sign(pilot, glider.id, body).expect(201)).body);
    expect(kept).toMatchObject({ ...body, number: 1, signedBy: 'Tobias', gliderId: glider.id });
    // (90·40 + 30·200) / 120 = 80; (120·80 − 5·120) / 125 = 72. The small glider’s chord is 200 mm.
    expect(kept.measured).toMatchObject({ mass: 120, x: 80, percentMac: 40 });
    expect(kept.flown).toMatchObject({ mass: 125, x: 72, percentMac: 36 });
    expect(changes(before, await countRows())).toEqual({ first_flights: 1 });
  });

  it('keeps a record once, however often and from however many devices it is sent', async () => {
    const { pilot, glider } = await pilotOfOne();
    const body = firstFlightBody();
    const answers = await Promise.all([1, 2, 3, 4].map(() => sign(pilot, glider.id, body)));
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201, 201]);
    expect(new Set(answers.map(({ body: kept }) => JSON.stringify(kept))).size).toBe(1);
    expect(await list(pilot, glider.id)).toHaveLength(1);
  });

  it('refuses another record under an id that was signed, and changes nothing', async () => {
    const { pilot, glider } = await pilotOfOne();
    const body = firstFlightBody();
    await sign(pilot, glider.id, body).expect(201);
    expectProblem(await sign(pilot, glider.id, { ...body, note: 'Better so' }), 'signed_already');
    expect(await list(pilot, glider.id)).toMatchObject([{ note: '' }]);
  });

  it('tells nobody that an id is taken by a glider of others', async () => {
    const [one, two] = [await pilotOfOne(), await pilotOfOne()];
    const body = firstFlightBody();
    await sign(one.pilot, one.glider.id, body).expect(201);
    const res = await sign(two.pilot, two.glider.id, body);
    expectProblem(res, 'signed_already');
    expect(JSON.stringify(res.body)).not.toContain(one.glider.id);
  });

  it('takes the finger test with the mass of one scale', async () => {
    const { pilot, glider } = await pilotOfOne();
    const method = { kind: 'finger', mass: 120, resolution: 0.1, tipsForwardAt: 78, tipsAftAt: 82 } as const;
    const { measured } = (await sign(pilot, glider.id, firstFlightBody({ method })).expect(201)).body;
    expect(measured.x).toBe(80);
    expect(measured.ux).toBeCloseTo(2 / Math.sqrt(3), 12);
  });

  it('lets a later record follow an earlier one of the same glider only', async () => {
    const { pilot, glider } = await pilotOfOne();
    const first = firstFlightBody();
    await sign(pilot, glider.id, first).expect(201);
    const next = firstFlightBody({ follows: first.id });
    expect((await sign(pilot, glider.id, next).expect(201)).body).toMatchObject({
      number: 2,
      follows: first.id,
    });
    const lost = firstFlightBody({ follows: randomUUID() });
    expect(refusedFields(await sign(pilot, glider.id, lost))).toEqual(['#/follows']);
  });

  it('refuses scales that carry nothing, a state that was never saved, and an unsigned record', async () => {
    const { pilot, glider } = await pilotOfOne();
    const before = await countRows();
    const body = firstFlightBody();
    if (body.method.kind !== 'supports') throw new Error('no supports');
    const supports = body.method.supports.map((support) => ({ ...support, tare: support.reading }));
    const empty = { ...body, method: { kind: 'supports', supports } };
    expect(refusedFields(await sign(pilot, glider.id, empty))).toEqual(['#/method']);
    expect(refusedFields(await sign(pilot, glider.id, { ...body, gliderVersion: 9 }))).toEqual([
      '#/gliderVersion',
    ]);
    expect(refusedFields(await sign(pilot, glider.id, { ...body, signature: ' ' }))).toEqual(['#/signature']);
    expect(changes(before, await countRows())).toEqual({});
  });

  it('leaves a row that the database itself refuses to change, and that goes with its glider', async () => {
    const { owner, pilot, glider } = await pilotOfOne();
    const body = firstFlightBody();
    await sign(pilot, glider.id, body).expect(201);
    await expect(FirstFlight.update({ number: 7 }, { where: { id: body.id } })).rejects.toThrow(/unchanging/);
    await expect(database().query('TRUNCATE first_flights')).rejects.toThrow(/unchanging/);
    await owner.agent.delete(`/api/gliders/${glider.id}`).set('If-Match', '"1"').expect(204);
    expect(await FirstFlight.findByPk(body.id)).toBeNull();
  });
});
