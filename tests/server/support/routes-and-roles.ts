import type { ClubRole } from '#shared/schemas/club.ts';
import type { GliderRole } from '#shared/schemas/glider.ts';
import type { Endpoint } from '#server/http/endpoint.ts';
import type {
  ClubAction,
  GliderAction,
  MaterialAction,
  MaterialStanding,
  StockPieceAction,
} from '#server/policies/table.ts';
import { ENDPOINTS } from '#server/routes/endpoints.ts';
import { nameOf } from './requests.ts';

/** Typed here a second time, so that a change of the table has to be meant. */
export const GLIDER_ROUTES: Record<string, { action: GliderAction; allowed: GliderRole[] }> = {
  'get /gliders/:id': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /gliders/:id': { action: 'edit', allowed: ['owner', 'builder'] },
  'delete /gliders/:id': { action: 'delete', allowed: ['owner'] },
  'put /gliders/:id/archived': { action: 'archive', allowed: ['owner'] },
  'get /gliders/:id/saves/:version': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'post /gliders/:id/saves/:version/restore': { action: 'edit', allowed: ['owner', 'builder'] },
  'put /gliders/:id/saves/:version/name': { action: 'nameSave', allowed: ['owner', 'builder'] },
  'get /gliders/:id/saves': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'get /gliders/:id/sheets': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'post /gliders/:id/sheets': { action: 'saveSheet', allowed: ['owner', 'builder', 'pilot'] },
  'get /gliders/:id/photos': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'post /gliders/:id/photos': { action: 'addPhoto', allowed: ['owner', 'builder', 'pilot'] },
  'get /gliders/:id/trials': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /gliders/:id/trials': { action: 'edit', allowed: ['owner', 'builder'] },
  'get /gliders/:id/weighings': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'post /gliders/:id/weighings': { action: 'weigh', allowed: ['owner', 'builder', 'pilot'] },
  'get /gliders/:id/build-terms': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /gliders/:id/build-terms': { action: 'weigh', allowed: ['owner', 'builder', 'pilot'] },
  'get /gliders/:id/first-flights': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'post /gliders/:id/first-flights': { action: 'signFlight', allowed: ['owner', 'builder', 'pilot'] },
  'get /gliders/:id/assignment': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /gliders/:id/assignment': { action: 'edit', allowed: ['owner', 'builder'] },
  'get /gliders/:id/members': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /gliders/:id/members/:userId': { action: 'share', allowed: ['owner'] },
  'delete /gliders/:id/members/:userId': { action: 'share', allowed: ['owner'] },
  'delete /gliders/:id/membership': { action: 'leave', allowed: ['builder', 'pilot', 'reader'] },
  'post /gliders/:id/ownership': { action: 'transfer', allowed: ['owner'] },
  'get /gliders/:id/link': { action: 'share', allowed: ['owner'] },
  'post /gliders/:id/link': { action: 'share', allowed: ['owner'] },
  'delete /gliders/:id/link': { action: 'share', allowed: ['owner'] },
  'get /gliders/:id/invitations': { action: 'share', allowed: ['owner'] },
  'post /gliders/:id/invitations': { action: 'share', allowed: ['owner'] },
  'delete /invitations/:id': { action: 'share', allowed: ['owner'] },
  'get /gliders/:id/aim': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /gliders/:id/aim': { action: 'edit', allowed: ['owner', 'builder'] },
  'delete /gliders/:id/aim': { action: 'edit', allowed: ['owner', 'builder'] },
  'get /photos/:id/image': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'get /photos/:id/thumbnail': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'put /photos/:id': { action: 'captionPhoto', allowed: ['owner', 'builder', 'pilot'] },
  'delete /photos/:id': { action: 'deletePhoto', allowed: ['owner', 'builder'] },
  'get /sheets/:id': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'get /sheets/:id/csv': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
  'get /sheets/:id/json': { action: 'read', allowed: ['owner', 'builder', 'pilot', 'reader'] },
};

export const MATERIAL_ROUTES: Record<string, { action: MaterialAction; allowed: MaterialStanding[] }> = {
  'get /materials/:id': { action: 'read', allowed: ['visitor', 'user', 'admin', 'keeper'] },
  'get /materials/:id/uses': { action: 'readUses', allowed: ['user', 'admin', 'keeper'] },
  'put /materials/:id': { action: 'edit', allowed: ['admin', 'keeper'] },
  'delete /materials/:id': { action: 'delete', allowed: ['admin', 'keeper'] },
};

export const PIECE_ROUTES: Record<string, StockPieceAction> = {
  'get /rack/:id': 'read',
  'put /rack/:id': 'edit',
  'delete /rack/:id': 'delete',
  'post /rack/:id/split': 'cut',
  'post /rack/:id/use': 'cut',
  'put /rack/:id/reservation': 'reserve',
  'delete /rack/:id/reservation': 'reserve',
  'put /rack/:id/photo': 'edit',
  'get /rack/:id/photo': 'read',
  'delete /rack/:id/photo': 'edit',
};

const EVERYBODY: ClubRole[] = ['secretary', 'director', 'member'];
export const CLUB_ROUTES: Record<string, { action: ClubAction; allowed: ClubRole[] }> = {
  'get /clubs/:id': { action: 'read', allowed: EVERYBODY },
  'put /clubs/:id': { action: 'edit', allowed: ['secretary'] },
  'get /clubs/:id/members': { action: 'read', allowed: EVERYBODY },
  'put /clubs/:id/members/:userId': { action: 'keepMembers', allowed: ['secretary'] },
  'delete /clubs/:id/members/:userId': { action: 'keepMembers', allowed: ['secretary'] },
  'delete /clubs/:id/membership': { action: 'leave', allowed: EVERYBODY },
  'get /clubs/:id/invitations': { action: 'keepMembers', allowed: ['secretary'] },
  'post /clubs/:id/invitations': { action: 'keepMembers', allowed: ['secretary'] },
  'delete /club-invitations/:id': { action: 'keepMembers', allowed: ['secretary'] },
  'get /clubs/:id/gliders': { action: 'read', allowed: EVERYBODY },
  'post /clubs/:id/class-editions': { action: 'keepClasses', allowed: ['secretary'] },
  'get /class-editions/:id': { action: 'read', allowed: EVERYBODY },
  'put /class-editions/:id': { action: 'keepClasses', allowed: ['secretary'] },
  'delete /class-editions/:id': { action: 'keepClasses', allowed: ['secretary'] },
};
/** What is one's own to show, whatever one is in the club. */
export const CLUB_GLIDER_ROUTES = ['put /clubs/:id/gliders/:gliderId', 'delete /clubs/:id/gliders/:gliderId'];

export function endpointOf(name: string): Endpoint {
  const endpoint = ENDPOINTS.find((candidate) => nameOf(candidate) === name);
  if (!endpoint) throw new Error(`There is no ${name}.`);
  return endpoint;
}
