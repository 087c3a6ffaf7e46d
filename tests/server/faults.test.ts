import { QueryTypes } from 'sequelize';
import { describe, expect, it, vi } from 'vitest';
import { openSequelize } from '#server/db/sequelize.ts';
import { GliderSave } from '#server/models/glider-save.ts';
import { Glider } from '#server/models/glider.ts';
import { useApp } from './support/app.ts';
import { ownDatabase, urlOf } from './support/database.ts';
import { makePerson } from './support/people.ts';
import { expectProblem } from './support/problems.ts';
import { makeGlider, smallPlan } from './support/rows.ts';

const app = useApp({}, () => ownDatabase('faults', 'migrated'));

/** Cuts every connection that the application has to its database. */
async function cutConnections(): Promise<number> {
  const other = openSequelize(urlOf('postgres'));
  const cut = await other.query<{ cut: boolean }>(
    'SELECT pg_terminate_backend(pid) AS cut FROM pg_stat_activity WHERE datname = ? AND pid <> pg_backend_pid()',
    { type: QueryTypes.SELECT, replacements: [app.sequelize.getDatabaseName()] },
  );
  await other.close();
  return cut.length;
}

describe('when the connections to the database break under load', () => {
  it('every save is either kept whole or refused with 503, and the service goes on', async () => {
    // Sequelize tells the console of every transaction that it could not end.
    vi.mocked(console.warn).mockImplementation(() => undefined);
    const { user, agent } = await makePerson(app);
    const gliders = await Promise.all(Array.from({ length: 8 }, () => makeGlider({ owner: user })));
    const statuses: number[] = [];
    const cutting = new AbortController();
    const saving = gliders.map(async ({ id }) => {
      let version = 1;
      while (!cutting.signal.aborted) {
        const call = agent.put(`/api/gliders/${id}`).set('If-Match', `"${version}"`);
        const res = await call.send({ plan: smallPlan({ name: `Save ${version}` }) });
        statuses.push(res.status);
        if (res.status === 200) version = res.body.version;
        else if (res.status === 412) version = res.body.current.version;
        else if (res.status !== 503) throw new Error(res.text);
        else expectProblem(res, 'unavailable');
      }
    });
    let cut = 0;
    for (let i = 0; i < 6; i += 1) {
      await new Promise((resolve) => setTimeout(resolve, 120));
      cut += await cutConnections();
    }
    cutting.abort();
    await Promise.all(saving);

    vi.mocked(console.warn).mockClear();

    expect(cut).toBeGreaterThan(6);
    expect(statuses).toContain(200);
    expect(statuses).toContain(503);
    await agent.get('/api/gliders').expect(200);
    for (const { id } of gliders) {
      const glider = await Glider.findByPk(id, { rejectOnEmpty: true });
      const saves = await GliderSave.findAll({ where: { gliderId: id }, order: ['version'] });
      expect(saves.map(({ version }) => version)).toEqual(saves.map((_, i) => i + 1));
      expect(saves.at(-1)).toMatchObject({ version: glider.version, plan: glider.plan, mass: glider.mass });
    }
  });
});
