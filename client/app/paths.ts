/** Places of a glider, in the order of their tabs. */
export const PLACES = [
  'drawing',
  'balance',
  'loading',
  'trial',
  'built',
  'cut',
  'flight',
  'sheets',
  'log',
] as const;
export type Place = (typeof PLACES)[number];
/** The sample is not stored, so it has no sheets and no log. */
export const SAMPLE_PLACES = [
  'drawing',
  'balance',
  'loading',
  'trial',
  'cut',
] as const satisfies readonly Place[];

/** What a read-only link shows to whoever has it. */
export const SHARED_PLACES = ['drawing', 'balance', 'loading'] as const satisfies readonly Place[];

/** Every address of the client, for links; the routes are in `router.tsx`. */
export const paths = {
  home: '/',
  signIn: (next?: string) => (next === undefined ? '/sign-in' : `/sign-in?next=${encodeURIComponent(next)}`),
  signUp: (next?: string) => (next === undefined ? '/sign-up' : `/sign-up?next=${encodeURIComponent(next)}`),
  forgotPassword: '/forgot-password',
  bench: '/bench',
  start: '/start',
  materials: '/materials',
  rack: '/rack',
  rackPiece: (id: string) => `/rack/${encodeURIComponent(id)}`,
  rackLabels: (ids: readonly string[]) => `/rack/labels?pieces=${ids.join(',')}`,
  account: '/account',
  sharing: (id: string) => `/gliders/${id}/sharing`,
  glider: (id: string, place: Place = 'drawing') => `/gliders/${id}/${place}`,
  sample: (place: (typeof SAMPLE_PLACES)[number] = 'drawing') => `/sample/${place}`,
  shared: (token: string, place: (typeof SHARED_PLACES)[number] = 'drawing') => `/shared/${token}/${place}`,
  invitation: (token: string) => `/invitations/${token}`,
  sheet: (id: string) => `/sheets/${id}`,
} as const;

/** Where to go after signing in: a path of our own, never another site. */
export function safeNext(next: string | null): string {
  return next !== null && /^\/(?![/\\])/.test(next) ? next : paths.bench;
}
