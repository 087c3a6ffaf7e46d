import type { UserDto } from '#shared/schemas/session.ts';
import { forbidden } from '#server/errors.ts';
import { POLICY, type SiteAction } from './table.ts';

const DOING: Record<SiteAction, string> = {
  addOwnMaterial: 'add materials',
  addSharedMaterial: 'add to the shared table of materials',
  addGlider: 'add gliders',
  addStockPiece: 'add pieces to a rack',
  addClub: 'found clubs',
  addClassEdition: 'add to everybody’s limits of classes',
};

export function maySite(role: UserDto['role'], action: SiteAction): boolean {
  const allowed: readonly UserDto['role'][] = POLICY.site[action];
  return allowed.includes(role);
}

/** @throws AppError `forbidden` */
export function authorizeSite(actor: UserDto, action: SiteAction): void {
  if (!maySite(actor.role, action)) throw forbidden(`You may not ${DOING[action]}.`);
}
