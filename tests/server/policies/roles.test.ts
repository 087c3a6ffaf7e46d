import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { gliderRole } from '#shared/schemas/glider.ts';
import type { Material } from '#server/models/material.ts';
import { POLICY, type MaterialStanding } from '#server/policies/table.ts';
import { ENDPOINTS } from '#server/routes/endpoints.ts';
import { useApp } from '../support/app.ts';
import { makePerson, type Person } from '../support/people.ts';
import { makeEdition } from '../support/clubs.ts';
import { expectProblem } from '../support/problems.ts';
import { nameOf, send, type Params } from '../support/requests.ts';
import {
  CLUB_GLIDER_ROUTES,
  CLUB_ROUTES,
  endpointOf,
  GLIDER_ROUTES,
  MATERIAL_ROUTES,
  PIECE_ROUTES,
} from '../support/routes-and-roles.ts';
import { addMember, makeMaterial, MATERIAL } from '../support/rows.ts';
import { makeWorld } from '../support/world.ts';

const app = useApp();

/** What a route is sent where it has to name a row that is there. */
async function bodyFor(route: string, params: Params): Promise<Record<string, unknown> | undefined> {
  if (route.endsWith('/ownership')) return { userId: params['userId'] };
  if (route === 'put /gliders/:id/aim') return { editionId: (await makeEdition(null)).id };
  return undefined;
}

describe('roles on a glider', () => {
  const cases = Object.keys(GLIDER_ROUTES).flatMap((route) =>
    gliderRole.options.map((role) => [role, route] as const),
  );

  it.each(cases)('%s: %s goes as the table says', async (role, route) => {
    const { owner, glider, paramsOf } = await makeWorld(app);
    const person = role === 'owner' ? owner : await makePerson(app);
    if (role !== 'owner') await addMember(glider, person.user, role);

    const endpoint = endpointOf(route);
    const params = paramsOf(endpoint);
    const body = await bodyFor(route, params);
    const res = await send(person.agent, endpoint, params, body);

    if (GLIDER_ROUTES[route]?.allowed.includes(role)) expect(res.ok).toBe(true);
    else expectProblem(res, 'forbidden');
  });

  it.each(gliderRole.options)('tell a %s beforehand what will be allowed', async (role) => {
    const { owner, glider } = await makeWorld(app);
    const person = role === 'owner' ? owner : await makePerson(app);
    if (role !== 'owner') await addMember(glider, person.user, role);
    const { can } = (await person.agent.get(`/api/gliders/${glider.id}`).expect(200)).body;
    const actions = Object.values(GLIDER_ROUTES);
    for (const { action, allowed } of actions.filter((route) => route.action !== 'read')) {
      expect([action, can[action]]).toEqual([action, allowed.includes(role)]);
    }
  });

  it('give a site admin no way into somebody else’s glider', async () => {
    const admin = await makePerson(app, { role: 'admin' });
    const { paramsOf } = await makeWorld(app);
    for (const endpoint of Object.keys(GLIDER_ROUTES).map(endpointOf)) {
      expectProblem(await send(admin.agent, endpoint, paramsOf(endpoint)), 'not_found');
    }
  });
});

describe('standing to a material', () => {
  const standings: MaterialStanding[] = ['visitor', 'user', 'admin', 'keeper'];
  const cases = Object.keys(MATERIAL_ROUTES).flatMap((route) =>
    standings.map((who) => [who, route] as const),
  );

  async function caseOf(standing: MaterialStanding): Promise<{ agent: Person['agent']; row: Material }> {
    if (standing === 'visitor') return { agent: app.visitor(), row: await makeMaterial() };
    const { user, agent } = await makePerson(app, { role: standing === 'admin' ? 'admin' : 'user' });
    return { agent, row: await makeMaterial(standing === 'keeper' ? { owner: user } : {}) };
  }

  it.each(cases)('%s: %s goes as the table says', async (standing, route) => {
    const { agent, row } = await caseOf(standing);
    const body = { ...MATERIAL, shared: row.ownerId === null };
    const res = await send(agent, endpointOf(route), { id: row.id }, body);
    if (MATERIAL_ROUTES[route]?.allowed.includes(standing)) expect(res.ok).toBe(true);
    else expectProblem(res, standing === 'visitor' ? 'signed_out' : 'forbidden');
  });
});

describe('standing to a stock piece', () => {
  it.each(Object.keys(PIECE_ROUTES))('%s is for the keeper of the rack alone', async (route) => {
    const { owner, glider, paramsOf } = await makeWorld(app);
    const builder = await makePerson(app);
    await addMember(glider, builder.user, 'builder');
    const admin = await makePerson(app, { role: 'admin' });
    const endpoint = endpointOf(route);
    const body = route === 'put /rack/:id/reservation' ? { gliderId: glider.id } : undefined;
    for (const { agent } of [builder, admin]) {
      expectProblem(await send(agent, endpoint, paramsOf(endpoint), body), 'not_found');
    }
    expect((await send(owner.agent, endpoint, paramsOf(endpoint), body)).ok).toBe(true);
  });
});

describe('the table', () => {
  it('says of every action what is expected here', () => {
    for (const { action, allowed } of Object.values(GLIDER_ROUTES))
      expect(POLICY.glider[action]).toEqual(allowed);
    for (const { action, allowed } of Object.values(MATERIAL_ROUTES))
      expect(POLICY.material[action]).toEqual(allowed);
    expect(POLICY.site).toEqual({
      addOwnMaterial: ['user', 'admin'],
      addSharedMaterial: ['admin'],
      addGlider: ['user', 'admin'],
      addStockPiece: ['user', 'admin'],
      addClub: ['user', 'admin'],
      addClassEdition: ['admin'],
    });
    for (const { action, allowed } of Object.values(CLUB_ROUTES))
      expect(POLICY.club[action]).toEqual(allowed);
    for (const action of Object.values(PIECE_ROUTES)) expect(POLICY.stockPiece[action]).toEqual(['keeper']);
  });

  it('is walked here for every route about one glider, sheet or material', () => {
    // A session is its user’s own; nobody has a role on it.
    const walked = [
      'delete /account/sessions/:id',
      ...CLUB_GLIDER_ROUTES,
      ...[GLIDER_ROUTES, MATERIAL_ROUTES, PIECE_ROUTES, CLUB_ROUTES].flatMap((routes) => Object.keys(routes)),
    ];
    const all = ENDPOINTS.filter(({ path }) => path.includes(':id')).map(nameOf);
    expect(walked.toSorted()).toEqual(all.toSorted());
  });

  it('finds no role for somebody without one', async () => {
    const { agent } = await makePerson(app);
    expectProblem(await agent.get(`/api/gliders/${randomUUID()}`), 'not_found');
  });
});
