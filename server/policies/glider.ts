import type { GliderAbilities, GliderRole } from '#shared/schemas/glider.ts';
import { forbidden } from '#server/errors.ts';
import { POLICY, type GliderAction } from './table.ts';

export function mayOnGlider(role: GliderRole, action: GliderAction): boolean {
  const allowed: readonly GliderRole[] = POLICY.glider[action];
  return allowed.includes(role);
}

const DOING: Record<GliderAction, string> = {
  read: 'see this glider',
  edit: 'change this glider',
  saveSheet: 'save sheets of this glider',
  delete: 'delete this glider',
  nameSave: 'name its saved states',
  addPhoto: 'add photos to this glider',
  captionPhoto: 'change the captions of its photos',
  deletePhoto: 'delete its photos',
  archive: 'archive this glider',
  share: 'share this glider',
  transfer: 'hand this glider over',
  leave: 'leave this glider; hand it over first',
  weigh: 'weigh parts of this glider',
  signFlight: 'sign first flights of this glider',
};

/** @throws AppError `forbidden` */
export function authorizeGlider(role: GliderRole, action: GliderAction): void {
  if (!mayOnGlider(role, action)) throw forbidden(`As its ${role} you may not ${DOING[action]}.`);
}

export function gliderAbilities(role: GliderRole): GliderAbilities {
  return {
    edit: mayOnGlider(role, 'edit'),
    saveSheet: mayOnGlider(role, 'saveSheet'),
    delete: mayOnGlider(role, 'delete'),
    nameSave: mayOnGlider(role, 'nameSave'),
    addPhoto: mayOnGlider(role, 'addPhoto'),
    captionPhoto: mayOnGlider(role, 'captionPhoto'),
    deletePhoto: mayOnGlider(role, 'deletePhoto'),
    archive: mayOnGlider(role, 'archive'),
    share: mayOnGlider(role, 'share'),
    transfer: mayOnGlider(role, 'transfer'),
    leave: mayOnGlider(role, 'leave'),
    weigh: mayOnGlider(role, 'weigh'),
    signFlight: mayOnGlider(role, 'signFlight'),
  };
}
