import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import type { Endpoint } from '#server/http/endpoint.ts';
import { ENDPOINTS } from '#server/routes/endpoints.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { makeGlider, makeMaterial, MATERIAL, smallPlan } from '../support/rows.ts';
import { makeSheet } from '../support/sheets.ts';

const app = useApp();

const nameOf = ({ method, path }: Endpoint) => `${method.toUpperCase()} /api${path}`;
const named = (endpoints: readonly Endpoint[]) =>
  endpoints.map((endpoint) => [nameOf(endpoint), endpoint] as const);

const needSession = ENDPOINTS.filter(({ access }) => access === 'signed-in');
const withId = ENDPOINTS.filter(({ path }) => path.includes(':id'));
const withBody = ENDPOINTS.filter(({ schemas }) => schemas.body);

/** A body that the endpoint takes. */
function goodBody(path: string): object {
  if (path.endsWith('/sheets')) return { note: '' };
  return path.startsWith('/materials') ? MATERIAL : { plan: smallPlan() };
}

function send(agent: Person['agent'], { method, path, ifMatch, schemas }: Endpoint, id: string) {
  const call = agent[method](`/api${path.replace(':id', id)}`);
  if (ifMatch) call.set('If-Match', '"1"');
  return schemas.body ? call.send(goodBody(path)) : call;
}

/** The id of a row of somebody else's that the endpoint is about. */
async function foreignRow(path: string): Promise<string> {
  const owner = await makePerson(app);
  if (path.startsWith('/materials')) return (await makeMaterial({ owner: owner.user })).id;
  const glider = await makeGlider({ owner: owner.user });
  return path.startsWith('/sheets') ? (await makeSheet(glider, owner.user)).id : glider.id;
}

describe('every endpoint', () => {
  it.each(named(needSession))('%s answers a visitor with 401 and changes nothing', async (_, endpoint) => {
    const id = await foreignRow(endpoint.path);
    const before = await countRows();
    expectProblem(await send(app.visitor(), endpoint, id), 'signed_out');
    expect(changes(before, await countRows())).toEqual({});
  });

  it.each(named(withId))(
    '%s hides somebody else’s row as if it did not exist and changes nothing',
    async (_, endpoint) => {
      const { agent } = await makePerson(app);
      const id = await foreignRow(endpoint.path);
      const before = await countRows();
      const foreign = expectProblem(await send(agent, endpoint, id), 'not_found');
      const absent = expectProblem(await send(agent, endpoint, randomUUID()), 'not_found');
      expect(foreign).toEqual(absent);
      expect(changes(before, await countRows())).toEqual({});
    },
  );

  it.each(named(withId))('%s refuses an id that is no UUID', async (_, endpoint) => {
    const { agent } = await makePerson(app);
    expect(refusedFields(await send(agent, endpoint, '7; DROP TABLE gliders'))).toEqual(['#/id']);
  });

  it.each(named(withBody))(
    '%s refuses a body that is not JSON, not an object or not there',
    async (_, { method, path, ifMatch }) => {
      const { agent } = await makePerson(app);
      const call = () => {
        const sent = agent[method](`/api${path.replace(':id', randomUUID())}`);
        return ifMatch ? sent.set('If-Match', '"1"') : sent;
      };
      expectProblem(await call().type('json').send('{"plan": '), 'malformed_json');
      expectProblem(await call().type('text/plain').send('plan'), 'unsupported_type');
      expect(refusedFields(await call().type('json').send('[]'))).toEqual(['#']);
      expect(refusedFields(await call()).length).toBeGreaterThan(0);
    },
  );

  it.each(named(withBody))('%s refuses a field that it does not know, by name', async (_, endpoint) => {
    const { agent } = await makePerson(app);
    const call = send(agent, endpoint, randomUUID()).send({ ...goodBody(endpoint.path), favourite: 1 });
    expect(refusedFields(await call)).toContain('#/favourite');
  });

  it.each(named(ENDPOINTS.filter(({ method }) => method !== 'get')))(
    '%s is refused to a page of another site and changes nothing',
    async (_, endpoint) => {
      const { agent } = await makePerson(app);
      const before = await countRows();
      const call = send(agent, endpoint, randomUUID()).set('Sec-Fetch-Site', 'cross-site');
      expectProblem(await call, 'forbidden');
      expect(changes(before, await countRows())).toEqual({});
    },
  );

  it('answers an address that does not exist with 404 problem details', async () => {
    const { agent } = await makePerson(app);
    expectProblem(await agent.get('/api/gliderz'), 'not_found');
    expectProblem(await agent.patch(`/api/gliders/${randomUUID()}`).send({}), 'not_found');
    expectProblem(await agent.get('/api/gliders/%E0%A4%A'), 'not_found');
    expectProblem(await agent.post('/elsewhere'), 'not_found');
  });
});
