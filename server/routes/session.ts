import { session, signIn as signInSchema } from '#shared/schemas/session.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { browserOf } from '#server/http/browser.ts';
import { currentSession, endSession, signIn } from '#server/services/sessions.ts';

export const sessionEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/session',
    tag: 'Account',
    summary: 'Who is signed in here; null for a visitor',
    access: 'anyone',
    answer: { status: 200, schema: session },
    handle: async ({ actor }) => ({ body: await currentSession(actor) }),
  }),
  endpoint({
    method: 'post',
    path: '/session',
    tag: 'Account',
    summary: 'Sign in',
    access: 'public',
    limits: ['signInByAddress', 'signInByAccount'],
    body: signInSchema,
    answer: { status: 200, schema: session },
    problems: ['wrong_credentials'],
    handle: async ({ body, req }) => {
      const { session: begun, cookie } = await signIn(body, browserOf(req));
      return { body: begun, cookie };
    },
  }),
  endpoint({
    method: 'delete',
    path: '/session',
    tag: 'Account',
    summary: 'Sign out',
    access: 'public',
    answer: { status: 204 },
    handle: async ({ req }) => ({ cookie: await endSession(req.get('Cookie')) }),
  }),
];
