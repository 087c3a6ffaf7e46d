import { QueryTypes } from 'sequelize';
import { beforeAll, describe, expect, it, vi } from 'vitest';
import { LIMITS } from '#shared/schemas/limits.ts';
import { rackList } from '#shared/schemas/rack.ts';
import { useApp } from '../support/app.ts';
import { ownDatabase } from '../support/database.ts';
import { makePerson, type Person } from '../support/people.ts';
import { nodesOf, type PlanNode } from '../support/query-plans.ts';
import { fillRack } from '../support/stock.ts';

const app = useApp({}, () => ownDatabase('rack', 'migrated'));

let person: Person;

beforeAll(async () => {
  person = await makePerson(app);
  const other = await makePerson(app);
  await fillRack(app, person.user, LIMITS.rack.max);
  await fillRack(app, other.user, LIMITS.rack.max);
  await app.sequelize.query('ANALYZE');
});

/** The statements about pieces that a request sends to the database. */
async function statementsOf(query: object): Promise<{ statements: string[]; body: unknown }> {
  const asked = vi.spyOn(app.sequelize, 'query');
  const { body } = await person.agent.get('/api/rack').query(query).expect(200);
  const statements = asked.mock.calls.flatMap(([statement]) =>
    typeof statement === 'string' ? [statement] : [],
  );
  asked.mockRestore();
  return { statements: statements.filter((statement) => statement.includes('stock_pieces')), body };
}

async function nodesOfQuery(query: object): Promise<PlanNode[]> {
  const { statements } = await statementsOf(query);
  expect(statements).toHaveLength(1);
  const [row] = await app.sequelize.query<{ 'QUERY PLAN': [{ Plan: PlanNode }] }>(
    `EXPLAIN (ANALYZE, FORMAT JSON) ${statements[0]}`,
    { type: QueryTypes.SELECT },
  );
  return nodesOf(row!['QUERY PLAN'][0].Plan);
}

describe('a page of a rack of ten thousand pieces', () => {
  it.each([
    ['number', 'asc', 'stock_pieces_by_number'],
    ['number', 'desc', 'stock_pieces_by_number'],
    ['material', 'asc', 'stock_pieces_by_material'],
    ['length', 'desc', 'stock_pieces_by_length'],
    ['thickness', 'asc', 'stock_pieces_by_thickness'],
    ['mass', 'asc', 'stock_pieces_by_mass'],
    ['mass', 'desc', 'stock_pieces_by_mass_down'],
    ['density', 'asc', 'stock_pieces_by_density'],
    ['density', 'desc', 'stock_pieces_by_density_down'],
  ])(
    'in the order of %s, %s, and from its middle, is one query that walks one index and sorts nothing',
    async (order, direction, index) => {
      let cursor: string | null = null;
      for (let pages = 0; pages < 30; pages += 1) {
        const { body } = await statementsOf({ order, direction, limit: '100', ...(cursor && { cursor }) });
        cursor = rackList.parse(body).nextCursor;
      }
      expect(cursor).not.toBeNull();
      for (const query of [
        { order, direction, limit: '50' },
        { order, direction, limit: '50', cursor },
      ]) {
        const nodes = await nodesOfQuery(query);
        const kinds = nodes.map((node) => node['Node Type']);
        expect(kinds.filter((kind) => /Seq Scan|Sort|Bitmap/.test(kind))).toEqual([]);
        const walked = nodes.filter((node) => node['Index Name'] === index);
        expect(walked).toHaveLength(1);
        // The page and the one row beyond that tells whether there is another.
        expect(walked[0]?.['Actual Rows']).toBe(51);
      }
    },
  );
});
