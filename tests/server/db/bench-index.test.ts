import { QueryTypes } from 'sequelize';
import { beforeAll, describe, expect, it, vi } from 'vitest';
import { gliderList } from '#shared/schemas/glider.ts';
import { useApp } from '../support/app.ts';
import { ownDatabase } from '../support/database.ts';
import { makePerson, type Person } from '../support/people.ts';
import { nodesOf, type PlanNode } from '../support/query-plans.ts';

const app = useApp({}, () => ownDatabase('bench', 'migrated'));

const GLIDERS = 3_000;
let person: Person;

/** Two benches of the same size in one table, so that a page has to be found among others' rows. */
async function fillBench(userId: string): Promise<void> {
  const replacements = { userId, count: GLIDERS };
  await app.sequelize.query(
    `INSERT INTO gliders (id, owner_id, name, plan, mass_g, outline, updated_by, updated_at)
     SELECT gen_random_uuid(), :userId, 'Glider ' || (n * 7919) % :count, '{}', (n * 104729) % 1009, '[]', :userId,
       now() - n * interval '1 minute'
     FROM generate_series(1, :count) AS n`,
    { replacements },
  );
  await app.sequelize.query(
    `INSERT INTO glider_members (owner_id, glider_id, user_id, role)
     SELECT owner_id, id, owner_id, 'owner' FROM gliders WHERE owner_id = :userId`,
    { replacements },
  );
}

beforeAll(async () => {
  person = await makePerson(app);
  const other = await makePerson(app);
  await fillBench(person.user.id);
  await fillBench(other.user.id);
  await app.sequelize.query('ANALYZE');
});

/** The statements about gliders that a request sends to the database. */
async function statementsOf(query: object): Promise<{ statements: string[]; body: unknown }> {
  const asked = vi.spyOn(app.sequelize, 'query');
  const { body } = await person.agent.get('/api/gliders').query(query).expect(200);
  const statements = asked.mock.calls.flatMap(([statement]) =>
    typeof statement === 'string' ? [statement] : [],
  );
  asked.mockRestore();
  return { statements: statements.filter((statement) => statement.includes('glider_members')), body };
}

describe('a page of a bench of three thousand gliders', () => {
  it.each([
    ['changed', 'glider_members_by_change'],
    ['name', 'glider_members_by_name'],
    ['mass', 'glider_members_by_mass'],
  ])(
    'in the order of %s, and from its middle, is one query that walks one index and sorts nothing',
    async (sort, index) => {
      let cursor: string | null = null;
      for (let page = 0; page < 15; page += 1) {
        const { body } = await statementsOf({ sort, limit: '100', ...(cursor && { cursor }) });
        cursor = gliderList.parse(body).nextCursor;
      }
      for (const query of [
        { sort, limit: '50' },
        { sort, limit: '50', cursor },
      ]) {
        const { statements } = await statementsOf(query);
        expect(statements).toHaveLength(1);
        const [row] = await app.sequelize.query<{ 'QUERY PLAN': [{ Plan: PlanNode }] }>(
          `EXPLAIN (ANALYZE, FORMAT JSON) ${statements[0]}`,
          { type: QueryTypes.SELECT },
        );
        const nodes = nodesOf(row!['QUERY PLAN'][0].Plan);
        const ofGliders = nodes.filter((node) => node['Relation Name'] !== 'users');
        const kinds = ofGliders.map((node) => node['Node Type']);
        expect(kinds.filter((kind) => /Seq Scan|Sort|Bitmap/.test(kind))).toEqual([]);
        const walked = nodes.filter((node) => node['Index Name'] === index);
        expect(walked).toHaveLength(1);
        // The page and the one row beyond that tells whether there is another.
        expect(walked[0]?.['Actual Rows']).toBe(51);
      }
    },
  );
});
