import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { gliderRole, type GliderRole } from '#shared/schemas/glider.ts';
import type { Endpoint } from '#server/http/endpoint.ts';
import type { Material } from '#server/models/material.ts';
import {
  POLICY,
  type GliderAction,
  type MaterialAction,
  type MaterialStanding,
  type StockPieceAction,
} from '#server/policies/table.ts';
import { ENDPOINTS } from '#server/routes/endpoints.ts';
import { useApp } from '../support/app.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem } from '../support/problems.ts';
import { nameOf, send } from '../support/requests.ts';
import { addMember, makeMaterial, MATERIAL } from '../support/rows.ts';
import { makeWorld } from '../support/world.ts';

const app = useApp();

/** Typed here a second time, so that a change of the table has to be meant. */
const GLIDER_ROUTES: Record<string, { action: GliderAction; allowed: GliderRole[] }> = {
  'get /gliders/:id': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /gliders/:id': { action: 'edit', allowed: ['owner', 'builder'] },
  'delete /gliders/:id': { action: 'delete', allowed: ['owner'] },
  'put /gliders/:id/archived': { action: 'archive', allowed: ['owner'] },
  'get /gliders/:id/saves/:version': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'post /gliders/:id/saves/:version/restore': { action: 'edit', allowed: ['owner', 'builder'] },
  'put /gliders/:id/saves/:version/name': { action: 'nameSave', allowed: ['owner', 'builder'] },
  'get /gliders/:id/saves': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'get /gliders/:id/sheets': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'post /gliders/:id/sheets': { action: 'saveSheet', allowed: ['owner', 'builder', 'pilot'] },
  'get /gliders/:id/photos': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'post /gliders/:id/photos': { action: 'addPhoto', allowed: ['owner', 'builder', 'pilot'] },
  'get /gliders/:id/trials': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /gliders/:id/trials': { action: 'edit', allowed: ['owner', 'builder'] },
  'get /gliders/:id/weighings': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'post /gliders/:id/weighings': { action: 'weigh', allowed: ['owner', 'builder', 'pilot'] },
  'get /gliders/:id/build-terms': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /gliders/:id/build-terms': { action: 'weigh', allowed: ['owner', 'builder', 'pilot'] },
  'get /gliders/:id/first-flights': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'post /gliders/:id/first-flights': { action: 'signFlight', allowed: ['owner', 'builder', 'pilot'] },
  'get /gliders/:id/assignment': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /gliders/:id/assignment': { action: 'edit', allowed: ['owner', 'builder'] },
  'get /gliders/:id/members': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /gliders/:id/members/:userId': { action: 'share', allowed: ['owner'] },
  'delete /gliders/:id/members/:userId': { action: 'share', allowed: ['owner'] },
  'delete /gliders/:id/membership': { action: 'leave', allowed: ['builder', 'pilot', 'reader'] },
  'post /gliders/:id/ownership': { action: 'transfer', allowed: ['owner'] },
  'get /gliders/:id/link': { action: 'share', allowed: ['owner'] },
  'post /gliders/:id/link': { action: 'share', allowed: ['owner'] },
  'delete /gliders/:id/link': { action: 'share', allowed: ['owner'] },
  'get /gliders/:id/invitations': { action: 'share', allowed: ['owner'] },
  'post /gliders/:id/invitations': { action: 'share', allowed: ['owner'] },
  'delete /invitations/:id': { action: 'share', allowed: ['owner'] },
  'get /photos/:id/image': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'get /photos/:id/thumbnail': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /photos/:id': { action: 'captionPhoto', allowed: ['owner', 'builder', 'pilot'] },
  'delete /photos/:id': { action: 'deletePhoto', allowed: ['owner', 'builder'] },
  'get /sheets/:id': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'get /sheets/:id/csv': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'get /sheets/:id/json': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
};

const MATERIAL_ROUTES: Record<string, { action: MaterialAction; allowed: MaterialStanding[] }> = {
  'get /materials/:id': { action: 'read', allowed: ['visitor', 'user', 'admin', 'keeper'] },
  'get /materials/:id/uses': { action: 'readUses', allowed: ['user', 'admin', 'keeper'] },
  'put /materials/:id': { action: 'edit', allowed: ['admin', 'keeper'] },
  'delete /materials/:id': { action: 'delete', allowed: ['admin', 'keeper'] },
};

const PIECE_ROUTES: Record<string, StockPieceAction> = {
  'get /rack/:id': 'read',
  'put /rack/:id': 'edit',
  'delete /rack/:id': 'delete',
  'post /rack/:id/split': 'cut',
  'post /rack/:id/use': 'cut',
  'put /rack/:id/reservation': 'reserve',
  'delete /rack/:id/reservation': 'reserve',
  'put /rack/:id/photo': 'edit',
  'get /rack/:id/photo': 'read',
  'delete /rack/:id/photo': 'edit',
};

function endpointOf(name: string): Endpoint {
  const endpoint = ENDPOINTS.find((candidate) => nameOf(candidate) === name);
  if (!endpoint) throw new Error(`There is no ${name}.`);
  return endpoint;
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
    const body = route.endsWith('/ownership') ? { userId: params['userId'] } : undefined;
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
    });
    for (const action of Object.values(PIECE_ROUTES)) expect(POLICY.stockPiece[action]).toEqual(['keeper']);
  });

  it('is walked here for every route about one glider, sheet or material', () => {
    // A session is its user’s own; nobody has a role on it.
    const walked = [
      'delete /account/sessions/:id',
      ...[GLIDER_ROUTES, MATERIAL_ROUTES, PIECE_ROUTES].flatMap((routes) => Object.keys(routes)),
    ];
    const all = ENDPOINTS.filter(({ path }) => path.includes(':id')).map(nameOf);
    expect(walked.toSorted()).toEqual(all.toSorted());
  });

  it('finds no role for somebody without one', async () => {
    const { agent } = await makePerson(app);
    expectProblem(await agent.get(`/api/gliders/${randomUUID()}`), 'not_found');
  });
});
