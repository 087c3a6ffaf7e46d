import type { ClassEditionDto } from '#shared/schemas/class-edition.ts';
import type { ClassEdition } from '#server/models/class-edition.ts';
import { mayWithEdition } from '#server/policies/club.ts';
import type { ClassEditionStanding } from '#server/policies/table.ts';

export function presentClassEdition(row: ClassEdition, standing: ClassEditionStanding): ClassEditionDto {
  const { id, clubId, key, name, issuedBy, edition, note, limits, version } = row;
  const inUse = row.usedAt !== null;
  const can = { edit: !inUse && mayWithEdition(standing, 'edit') };
  return { id, clubId, key, name, issuedBy, edition, note, limits, version, inUse, can };
}
