import { useQuery } from '@tanstack/react-query';
import { isPassing, request } from '#client/lib/api.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { materialList } from '#shared/schemas/material.ts';
import { snapshotOf, type TableMaterial } from './edits/materials.ts';

const NONE: readonly TableMaterial[] = [];

/**
 * The materials table to choose from, by name. The sample, and a reader without a connection, get the table as it
 * was delivered; whatever is chosen is copied into the plan.
 */
export function useMaterialTable(kind: Workspace['kind']): readonly TableMaterial[] {
  const { data } = useQuery({
    queryKey: ['materials', 'choices', kind],
    queryFn: ({ signal }) => (kind === 'saved' ? ownTable(signal) : delivered()),
    staleTime: kind === 'saved' ? 60_000 : Infinity,
  });
  return data ?? NONE;
}

async function ownTable(signal: AbortSignal): Promise<TableMaterial[]> {
  try {
    const { materials } = await request('/materials', materialList, { signal });
    return materials.map(snapshotOf);
  } catch (error) {
    if (!isPassing(error)) throw error;
    return delivered();
  }
}

async function delivered(): Promise<TableMaterial[]> {
  const { default: table } = await import('#data/materials.json');
  // The file is checked against the same schema by a test; JSON alone does not narrow its words.
  return table.materials.map((row) => snapshotOf(row as Parameters<typeof snapshotOf>[0]));
}
