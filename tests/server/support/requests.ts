import { randomUUID } from 'node:crypto';
import type { Endpoint } from '#server/http/endpoint.ts';
import { PASSWORD, type Person } from './people.ts';
import { buildTermsBody, firstFlightBody, weighingBody } from './built.ts';
import { editionBody } from './clubs.ts';
import { assignmentOf, SHEET } from './stock.ts';
import { MATERIAL, smallPlan } from './rows.ts';

/** In the form of a mailed link's, of which there is none. */
export const NO_TOKEN = 'A'.repeat(43);

export const nameOf = ({ method, path }: Endpoint) => `${method} ${path}`;

/** A body that each endpoint takes, by the endpoint's name. */
const BODIES: Record<string, () => Record<string, unknown>> = {
  'post /estimates': () => ({ plan: smallPlan() }),
  'post /gliders': () => ({ plan: smallPlan() }),
  'put /gliders/:id': () => ({ plan: smallPlan() }),
  'post /gliders/copies': () => ({ ids: [randomUUID()] }),
  'put /gliders/:id/archived': () => ({ archived: true }),
  'put /gliders/:id/saves/:version/name': () => ({ name: 'Before covering' }),
  'post /gliders/:id/sheets': () => ({ note: '' }),
  'post /rack': () => ({ ...SHEET }),
  'put /rack/:id': () => ({ ...SHEET }),
  'post /rack/:id/split': () => ({ along: 'length', wanted: [100], kerf: 1 }),
  'post /rack/:id/use': () => ({ gliderId: null, leftovers: [] }),
  'put /rack/:id/reservation': () => ({ gliderId: randomUUID() }),
  'put /rack/:id/photo': () => ({}),
  'post /rack/import-previews': () => ({}),
  'post /rack/imports': () => ({ rows: [SHEET] }),
  'put /gliders/:id/assignment': () => assignmentOf(),
  'put /gliders/:id/trials': () => ({ trials: [], terms: { arm: null, minimumMass: null } }),
  'post /gliders/:id/weighings': () => ({ ...weighingBody() }),
  'put /gliders/:id/build-terms': () => ({ ...buildTermsBody() }),
  'post /gliders/:id/first-flights': () => ({ ...firstFlightBody() }),
  'put /photos/:id': () => ({ caption: 'Nose block glued' }),
  'post /materials': () => ({ ...MATERIAL }),
  'put /materials/:id': () => ({ ...MATERIAL }),
  'post /gliders/:id/photos': () => ({ caption: 'Nose block glued' }),
  'patch /account': () => ({ name: 'Ada Quill' }),
  'post /account/email': () => ({ email: 'quill.new@larkmoor.example', password: PASSWORD }),
  'put /account/password': () => ({ current: PASSWORD, password: 'nine lime laminations' }),
  'post /account/deletion': () => ({ password: PASSWORD }),
  'post /email-verifications': () => ({ token: NO_TOKEN }),
  'post /password-resets': () => ({ email: 'quill@larkmoor.example' }),
  'put /password-resets': () => ({ token: NO_TOKEN, password: 'nine lime laminations' }),
  'post /gliders/:id/invitations': () => ({ email: 'quill@larkmoor.example', role: 'pilot' }),
  'post /invitations/preview': () => ({ token: NO_TOKEN }),
  'post /invitations/accept': () => ({ token: NO_TOKEN }),
  'post /invitations/decline': () => ({ token: NO_TOKEN }),
  'put /gliders/:id/members/:userId': () => ({ role: 'pilot' }),
  'post /gliders/:id/ownership': () => ({ userId: randomUUID() }),
  'put /gliders/:id/aim': () => ({ editionId: randomUUID() }),
  'post /clubs': () => ({ name: 'Tarn Side Flyers', place: '' }),
  'put /clubs/:id': () => ({ name: 'Tarn Side Flyers', place: 'Tarn Side' }),
  'put /clubs/:id/members/:userId': () => ({ role: 'director' }),
  'post /clubs/:id/invitations': () => ({ email: 'quill@larkmoor.example', role: 'member' }),
  'post /club-invitations/preview': () => ({ token: NO_TOKEN }),
  'post /club-invitations/accept': () => ({ token: NO_TOKEN }),
  'post /club-invitations/decline': () => ({ token: NO_TOKEN }),
  'post /class-editions': () => ({ ...editionBody() }),
  'post /clubs/:id/class-editions': () => ({ ...editionBody() }),
  'put /class-editions/:id': () => ({ ...editionBody({ edition: `2027 ${randomUUID()}` }) }),
  'post /users': () => ({
    name: 'Ada Quill',
    email: 'quill@larkmoor.example',
    password: 'nine lime laminations',
  }),
  'post /session': () => ({ email: 'quill@larkmoor.example', password: 'nine lime laminations' }),
};

export function goodBody(endpoint: Endpoint): Record<string, unknown> {
  const body = BODIES[nameOf(endpoint)];
  if (!body) throw new Error(`tests/server/support/requests.ts has no body for ${nameOf(endpoint)}.`);
  return body();
}

/** Values of the path's parameters; what is not given stands for nobody's row. */
export type Params = Record<string, string>;

export function pathOf(endpoint: Pick<Endpoint, 'path'>, params: Params): string {
  return `/api${endpoint.path.replace(/:(\w+)/g, (_, name: string) => params[name] ?? '1')}`;
}

/** A request without its body, with the version that it needs. */
export function call(agent: Person['agent'], endpoint: Endpoint, params: Params) {
  const request = agent[endpoint.method](pathOf(endpoint, params));
  return endpoint.ifMatch ? request.set('If-Match', '"1"') : request;
}

/** One pixel, as PNG. */
const tinyPicture = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAIAAACQd1PeAAAADElEQVR4nGNgYGAAAAAEAAH2FzhVAAAAAElFTkSuQmCC',
  'base64',
);

/** A whole request that is right in all but who asks for what. */
export function send(
  agent: Person['agent'],
  endpoint: Endpoint,
  params: Params,
  body: Record<string, unknown> = endpoint.schemas.body ? goodBody(endpoint) : {},
) {
  const request = call(agent, endpoint, params);
  if (endpoint.upload)
    return request
      .field(body as Record<string, string>)
      .attach(endpoint.upload.field, tinyPicture, 'photo.png');
  return endpoint.schemas.body ? request.send(body) : request;
}
