import type { Endpoint } from '#server/http/endpoint.ts';
import { accountEndpoints } from './account.ts';
import { invitationEndpoints } from './invitations.ts';
import { mailedLinkEndpoints } from './mailed-links.ts';
import { sharingEndpoints } from './sharing.ts';
import { classEditionEndpoints } from './class-editions.ts';
import { clubInvitationEndpoints } from './club-invitations.ts';
import { clubEndpoints } from './clubs.ts';
import { estimateEndpoints } from './estimates.ts';
import { gliderEndpoints } from './gliders.ts';
import { gliderAssignmentEndpoints } from './glider-assignments.ts';
import { gliderBenchEndpoints } from './glider-bench.ts';
import { gliderSaveEndpoints } from './glider-saves.ts';
import { gliderTrialsEndpoints } from './glider-trials.ts';
import { buildTermsEndpoints } from './build-terms.ts';
import { firstFlightEndpoints } from './first-flights.ts';
import { weighingEndpoints } from './weighings.ts';
import { healthEndpoints } from './health.ts';
import { materialEndpoints } from './materials.ts';
import { photoEndpoints } from './photos.ts';
import { rackFileEndpoints } from './rack-files.ts';
import { rackEndpoints } from './rack.ts';
import { sessionEndpoints } from './session.ts';
import { sheetEndpoints } from './sheets.ts';
import { stockPieceEndpoints } from './stock-pieces.ts';
import { userEndpoints } from './users.ts';

/** Everything that the API answers to, except its own description. */
export const ENDPOINTS: readonly Endpoint[] = [
  ...estimateEndpoints,
  ...gliderEndpoints,
  ...gliderBenchEndpoints,
  ...gliderSaveEndpoints,
  ...sheetEndpoints,
  ...weighingEndpoints,
  ...buildTermsEndpoints,
  ...firstFlightEndpoints,
  ...photoEndpoints,
  ...gliderTrialsEndpoints,
  ...gliderAssignmentEndpoints,
  ...rackFileEndpoints,
  ...rackEndpoints,
  ...stockPieceEndpoints,
  ...materialEndpoints,
  ...sharingEndpoints,
  ...invitationEndpoints,
  ...clubEndpoints,
  ...clubInvitationEndpoints,
  ...classEditionEndpoints,
  ...userEndpoints,
  ...accountEndpoints,
  ...mailedLinkEndpoints,
  ...sessionEndpoints,
  ...healthEndpoints,
];
