import { z } from 'zod';
import { session, signUp as signUpSchema, type SignUp } from '#shared/schemas/session.ts';
import { commonPassword, isCommonPassword } from '#server/auth/common-passwords.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { browserOf } from '#server/http/browser.ts';
import { signUp } from '#server/services/users.ts';

const typed = z.looseObject({
  name: z.string().catch(''),
  email: z.string().catch(''),
  password: z.string().catch(''),
});

/** The list of common passwords is asked even where another field is wrong, so that all is told at once. */
export const newUser = signUpSchema.refine(
  (input: SignUp) => !isCommonPassword(input.password, typed.parse(input)),
  {
    path: ['password'],
    message: commonPassword.detail,
    when: ({ value }) => (typed.safeParse(value).data?.password ?? '') !== '',
  },
);

export const userEndpoints: Endpoint[] = [
  endpoint({
    method: 'post',
    path: '/users',
    tag: 'Account',
    summary: 'Make an account and sign in',
    access: 'public',
    limits: ['signUps'],
    body: newUser,
    answer: { status: 201, schema: session },
    problems: ['email_taken'],
    handle: async ({ body, req }) => {
      const { session: begun, cookie } = await signUp(body, browserOf(req));
      return { body: begun, cookie };
    },
  }),
];
