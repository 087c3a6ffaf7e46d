import { QueryTypes } from 'sequelize';
import { database } from '#server/services/transaction.ts';

const TABLES = [
  'users',
  'materials',
  'gliders',
  'glider_members',
  'glider_materials',
  'glider_saves',
  'glider_save_names',
  'sheets',
  'glider_photos',
  'unused_files',
  'glider_trials',
  'glider_assignments',
  'stock_pieces',
  'rack_counters',
  'rack_imports',
  'sessions',
  'mailed_links',
  'mails',
  'invitations',
  'read_links',
  'weighings',
  'build_terms',
  'first_flights',
  'clubs',
  'club_members',
  'club_invitations',
  'club_gliders',
  'class_editions',
  'glider_aims',
  'idempotency_keys',
];

/** Rows of every table that a request could change. */
export async function countRows(): Promise<Map<string, number>> {
  const rows = await database().query<{ name: string; count: string }>(
    TABLES.map((table) => `SELECT '${table}' AS name, count(*) FROM ${table}`).join(' UNION ALL '),
    { type: QueryTypes.SELECT },
  );
  return new Map(rows.map(({ name, count }) => [name, Number(count)]));
}

/** By how much each table has grown, tables that stayed the same left out. */
export function changes(before: Map<string, number>, after: Map<string, number>): Record<string, number> {
  const differences = [...after].map(([name, count]): [string, number] => [
    name,
    count - (before.get(name) ?? 0),
  ]);
  return Object.fromEntries(differences.filter(([, difference]) => difference !== 0));
}
