import type { UserDto } from '#shared/schemas/session.ts';
import { forbidden } from '#server/errors.ts';
import { POLICY, type MaterialAction, type MaterialStanding } from './table.ts';

/** What the asker is to a row; null when the row is somebody else's private one. */
export function materialStanding(
  actor: Pick<UserDto, 'id' | 'role'> | null,
  row: { ownerId: string | null },
): MaterialStanding | null {
  if (row.ownerId === null) return actor?.role ?? 'visitor';
  return row.ownerId === actor?.id ? 'keeper' : null;
}

export function mayOnMaterial(standing: MaterialStanding, action: MaterialAction): boolean {
  const allowed: readonly MaterialStanding[] = POLICY.material[action];
  return allowed.includes(standing);
}

/** @throws AppError `forbidden` */
export function authorizeMaterial(standing: MaterialStanding, action: MaterialAction): void {
  if (!mayOnMaterial(standing, action))
    throw forbidden('Only an admin may change the shared table of materials.');
}
