import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import type { Endpoint } from '#server/http/endpoint.ts';
import { ENDPOINTS } from '#server/routes/endpoints.ts';
import { useApp } from '../support/app.ts';
import { changes, countRows } from '../support/counts.ts';
import { makePerson } from '../support/people.ts';
import { expectProblem, refusedFields } from '../support/problems.ts';
import { call, goodBody, NO_TOKEN, send } from '../support/requests.ts';
import { makeWorld } from '../support/world.ts';

const app = useApp();

const nameOf = ({ method, path }: Endpoint) => `${method.toUpperCase()} /api${path}`;
const named = (endpoints: readonly Endpoint[]) =>
  endpoints.map((endpoint) => [nameOf(endpoint), endpoint] as const);

const needSession = ENDPOINTS.filter(({ access }) => access === 'signed-in');
const withId = ENDPOINTS.filter(({ path }) => path.includes(':id'));
const withBody = ENDPOINTS.filter(({ schemas, upload }) => schemas.body && !upload);

/** Parameters that lead to nobody's row. */
const nowhere = () => ({
  id: randomUUID(),
  version: '1',
  userId: randomUUID(),
  gliderId: randomUUID(),
  token: NO_TOKEN,
});

describe('every endpoint', () => {
  it.each(named(needSession))('%s answers a visitor with 401 and changes nothing', async (_, endpoint) => {
    const params = (await makeWorld(app)).paramsOf(endpoint);
    const before = await countRows();
    expectProblem(await send(app.visitor(), endpoint, params), 'signed_out');
    expect(changes(before, await countRows())).toEqual({});
  });

  it.each(named(withId))(
    '%s hides somebody else’s row as if it did not exist and changes nothing',
    async (_, endpoint) => {
      const { agent } = await makePerson(app);
      const params = (await makeWorld(app)).paramsOf(endpoint);
      const before = await countRows();
      const foreign = expectProblem(await send(agent, endpoint, params), 'not_found');
      const absent = expectProblem(await send(agent, endpoint, nowhere()), 'not_found');
      expect(foreign).toEqual(absent);
      expect(changes(before, await countRows())).toEqual({});
    },
  );

  it.each(named(withId))('%s refuses an id that is no UUID', async (_, endpoint) => {
    const { agent } = await makePerson(app);
    const wrong = { ...nowhere(), id: '7; DROP TABLE gliders' };
    expect(refusedFields(await send(agent, endpoint, wrong))).toEqual(['#/id']);
  });

  it.each(named(withBody))(
    '%s refuses a body that is not JSON, not an object or not there',
    async (_, endpoint) => {
      const { agent } = await makePerson(app);
      const bare = () => call(agent, endpoint, nowhere());
      expectProblem(await bare().type('json').send('{"plan": '), 'malformed_json');
      expectProblem(await bare().type('text/plain').send('plan'), 'unsupported_type');
      expect(refusedFields(await bare().type('json').send('[]'))).toEqual(['#']);
      expect(refusedFields(await bare()).length).toBeGreaterThan(0);
    },
  );

  it.each(named(withBody))('%s refuses a field that it does not know, by name', async (_, endpoint) => {
    const { agent } = await makePerson(app);
    const sent = send(agent, endpoint, nowhere(), { ...goodBody(endpoint), favourite: 1 });
    expect(refusedFields(await sent)).toContain('#/favourite');
  });

  it.each(named(ENDPOINTS.filter(({ method }) => method !== 'get')))(
    '%s is refused to a page of another site and changes nothing',
    async (_, endpoint) => {
      const { agent } = await makePerson(app);
      const before = await countRows();
      const sent = send(agent, endpoint, nowhere()).set('Sec-Fetch-Site', 'cross-site');
      expectProblem(await sent, 'forbidden');
      expect(changes(before, await countRows())).toEqual({});
    },
  );

  it('answers an address that does not exist with 404 problem details', async () => {
    const { agent } = await makePerson(app);
    expectProblem(await agent.get('/api/gliderz'), 'not_found');
    expectProblem(await agent.patch(`/api/gliders/${randomUUID()}`).send({}), 'not_found');
    expectProblem(await agent.get(`/api/gliders/${randomUUID()}/wings`), 'not_found');
    expectProblem(await agent.get('/api/gliders/%E0%A4%A'), 'not_found');
    expectProblem(await agent.post('/elsewhere'), 'not_found');
  });
});
