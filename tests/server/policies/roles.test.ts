import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { gliderRole, type GliderRole } from '#shared/schemas/glider.ts';
import type { Material } from '#server/models/material.ts';
import {
  POLICY,
  type GliderAction,
  type MaterialAction,
  type MaterialStanding,
} from '#server/policies/table.ts';
import { ENDPOINTS } from '#server/routes/endpoints.ts';
import { useApp } from '../support/app.ts';
import { makePerson, type Person } from '../support/people.ts';
import { expectProblem } from '../support/problems.ts';
import { addMember, makeGlider, makeMaterial, MATERIAL, smallPlan } from '../support/rows.ts';
import { makeSheet } from '../support/sheets.ts';

const app = useApp();

/** Typed here a second time, so that a change of the table has to be meant. */
const GLIDER_ROUTES: Record<string, { action: GliderAction; allowed: GliderRole[] }> = {
  'get /gliders/:id': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /gliders/:id': { action: 'edit', allowed: ['owner', 'builder'] },
  'delete /gliders/:id': { action: 'delete', allowed: ['owner'] },
  'get /gliders/:id/saves': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'get /gliders/:id/sheets': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'post /gliders/:id/sheets': { action: 'saveSheet', allowed: ['owner', 'builder', 'pilot'] },
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

const nameOf = ({ method, path }: (typeof ENDPOINTS)[number]) => `${method} ${path}`;
const endpointOf = (name: string) => ENDPOINTS.find((endpoint) => nameOf(endpoint) === name);

function call(agent: Person['agent'], name: string, id: string, body: object) {
  const endpoint = endpointOf(name);
  if (!endpoint) throw new Error(`There is no ${name}.`);
  const request = agent[endpoint.method](`/api${endpoint.path.replace(':id', id)}`);
  if (endpoint.ifMatch) request.set('If-Match', '"1"');
  return endpoint.schemas.body ? request.send(body) : request;
}

describe('roles on a glider', () => {
  const cases = Object.keys(GLIDER_ROUTES).flatMap((route) =>
    gliderRole.options.map((role) => [role, route] as const),
  );

  it.each(cases)('%s: %s goes as the table says', async (role, route) => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const sheet = await makeSheet(glider, owner.user);
    const person = role === 'owner' ? owner : await makePerson(app);
    if (role !== 'owner') await addMember(glider, person.user, role);

    const id = route.includes('/sheets/:id') ? sheet.id : glider.id;
    const body = route.startsWith('post') ? { note: '' } : { plan: smallPlan() };
    const res = await call(person.agent, route, id, body);

    if (GLIDER_ROUTES[route]?.allowed.includes(role)) expect(res.ok).toBe(true);
    else expectProblem(res, 'forbidden');
  });

  it.each(gliderRole.options)('tell a %s beforehand what will be allowed', async (role) => {
    const owner = await makePerson(app);
    const glider = await makeGlider({ owner: owner.user });
    const person = role === 'owner' ? owner : await makePerson(app);
    if (role !== 'owner') await addMember(glider, person.user, role);
    const { can } = (await person.agent.get(`/api/gliders/${glider.id}`).expect(200)).body;
    const may = (route: string) => GLIDER_ROUTES[route]?.allowed.includes(role);
    expect(can).toMatchObject({
      edit: may('put /gliders/:id'),
      saveSheet: may('post /gliders/:id/sheets'),
      delete: may('delete /gliders/:id'),
    });
  });

  it('give a site admin no way into somebody else’s glider', async () => {
    const admin = await makePerson(app, { role: 'admin' });
    const glider = await makeGlider();
    for (const route of Object.keys(GLIDER_ROUTES).filter((name) => !name.includes('/sheets/:id'))) {
      const body = route.startsWith('post') ? { note: '' } : { plan: smallPlan() };
      expectProblem(await call(admin.agent, route, glider.id, body), 'not_found');
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
    const res = await call(agent, route, row.id, { ...MATERIAL, shared: row.ownerId === null });
    if (MATERIAL_ROUTES[route]?.allowed.includes(standing)) expect(res.ok).toBe(true);
    else expectProblem(res, standing === 'visitor' ? 'signed_out' : 'forbidden');
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
    });
  });

  it('is walked here for every route about one glider, sheet or material', () => {
    const walked = [...Object.keys(GLIDER_ROUTES), ...Object.keys(MATERIAL_ROUTES)];
    const all = ENDPOINTS.filter(({ path }) => path.includes(':id')).map(nameOf);
    expect(walked.toSorted()).toEqual(all.toSorted());
  });

  it('finds no role for somebody without one', async () => {
    const { agent } = await makePerson(app);
    expectProblem(await agent.get(`/api/gliders/${randomUUID()}`), 'not_found');
  });
});
