import type { ClubAbilities, ClubRole } from '#shared/schemas/club.ts';
import { forbidden } from '#server/errors.ts';
import { POLICY, type ClassEditionAction, type ClassEditionStanding, type ClubAction } from './table.ts';

export function mayInClub(role: ClubRole, action: ClubAction): boolean {
  const allowed: readonly ClubRole[] = POLICY.club[action];
  return allowed.includes(role);
}

const DOING: Record<ClubAction, string> = {
  read: 'see this club',
  edit: 'change this club',
  keepMembers: 'invite or change its members',
  keepClasses: 'write limits of classes for this club',
  runContests: 'run contests of this club',
  shareGlider: 'show gliders to this club',
  leave: 'leave this club',
};

/** @throws AppError `forbidden` */
export function authorizeClub(role: ClubRole, action: ClubAction): void {
  if (!mayInClub(role, action)) throw forbidden(`As its ${role} you may not ${DOING[action]}.`);
}

export function clubAbilities(role: ClubRole): ClubAbilities {
  return {
    edit: mayInClub(role, 'edit'),
    keepMembers: mayInClub(role, 'keepMembers'),
    keepClasses: mayInClub(role, 'keepClasses'),
    runContests: mayInClub(role, 'runContests'),
    shareGlider: mayInClub(role, 'shareGlider'),
  };
}

export function mayWithEdition(standing: ClassEditionStanding, action: ClassEditionAction): boolean {
  const allowed: readonly ClassEditionStanding[] = POLICY.classEdition[action];
  return allowed.includes(standing);
}
