import { describe, expect, it } from 'vitest';
import { clubRole, type ClubRole } from '#shared/schemas/club.ts';
import { POLICY, type ClubAction } from '#server/policies/table.ts';
import { useApp } from '../support/app.ts';
import { joinClub, makeEdition } from '../support/clubs.ts';
import { makePerson } from '../support/people.ts';
import { expectProblem } from '../support/problems.ts';
import { send } from '../support/requests.ts';
import { CLUB_GLIDER_ROUTES, CLUB_ROUTES, endpointOf } from '../support/routes-and-roles.ts';
import { makeGlider } from '../support/rows.ts';
import { makeWorld } from '../support/world.ts';

const app = useApp();

describe('roles in a club', () => {
  const cases = Object.keys(CLUB_ROUTES).flatMap((route) =>
    clubRole.options.map((role) => [role, route] as const),
  );

  it.each(cases)('%s: %s goes as the table says', async (role, route) => {
    const { club, paramsOf } = await makeWorld(app);
    const person = await makePerson(app);
    await joinClub(club, person.user, role);
    const endpoint = endpointOf(route);
    const res = await send(person.agent, endpoint, paramsOf(endpoint));
    if (CLUB_ROUTES[route]?.allowed.includes(role)) expect(res.ok).toBe(true);
    else expectProblem(res, 'forbidden');
  });

  it.each(clubRole.options)('tell a %s beforehand what will be allowed', async (role) => {
    const { club } = await makeWorld(app);
    const person = await makePerson(app);
    await joinClub(club, person.user, role);
    const { can } = (await person.agent.get(`/api/clubs/${club.id}`).expect(200)).body;
    for (const [action, allowed] of Object.entries(can)) {
      const roles: readonly ClubRole[] = POLICY.club[action as ClubAction];
      expect([action, allowed]).toEqual([action, roles.includes(role)]);
    }
  });

  it('give a site admin no way into somebody else’s club', async () => {
    const admin = await makePerson(app, { role: 'admin' });
    const { paramsOf } = await makeWorld(app);
    for (const endpoint of [...Object.keys(CLUB_ROUTES), ...CLUB_GLIDER_ROUTES].map(endpointOf)) {
      expectProblem(await send(admin.agent, endpoint, paramsOf(endpoint)), 'not_found');
    }
  });

  it('let a member show gliders of their own and of nobody else', async () => {
    const { club, owner, paramsOf, glider } = await makeWorld(app);
    const person = await makePerson(app);
    await joinClub(club, person.user, 'member');
    const [put, hide] = CLUB_GLIDER_ROUTES.map(endpointOf);
    if (!put || !hide) throw new Error('no routes');
    // Seen through the club, but not the member’s to show or to take back.
    expectProblem(await send(person.agent, put, paramsOf(put)), 'forbidden');
    expectProblem(await send(person.agent, hide, paramsOf(hide)), 'not_found');
    const own = await makeGlider({ owner: person.user });
    const params = { ...paramsOf(put), gliderId: own.id };
    expect((await send(person.agent, put, params)).status).toBe(204);
    expect((await send(owner.agent, hide, params)).status).toBe(204);
    expect((await send(owner.agent, hide, { ...params, gliderId: glider.id })).status).toBe(204);
  });

  it('let an admin keep everybody’s editions, and nobody else', async () => {
    const [admin, user] = [await makePerson(app, { role: 'admin' }), await makePerson(app)];
    const { id } = await makeEdition(null);
    for (const route of [
      'get /class-editions/:id',
      'put /class-editions/:id',
      'delete /class-editions/:id',
    ]) {
      const endpoint = endpointOf(route);
      const res = await send(user.agent, endpoint, { id });
      if (route.startsWith('get')) expect(res.ok).toBe(true);
      else expectProblem(res, 'forbidden');
      expect((await send(admin.agent, endpoint, { id })).ok).toBe(true);
    }
    const post = endpointOf('post /class-editions');
    expectProblem(await send(user.agent, post, {}), 'forbidden');
    expect((await send(admin.agent, post, {})).status).toBe(201);
  });
});
