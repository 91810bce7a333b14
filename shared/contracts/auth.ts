import { z } from 'zod';
import { givenName, id, moment } from './common';
import { endpoint } from './endpoint';

export const person = z.object({ id, email: z.string(), name: z.string() });
export type Person = z.infer<typeof person>;

export const email = z.email('Write an e-mail address, like name@lab.example.').max(254);
export const newPassword = z.string().min(10, 'At least 10 characters.').max(200, 'At most 200 characters.');
export const signUpBody = z.strictObject({ email, name: givenName, password: newPassword });
export const signInBody = z.strictObject({
  email,
  password: z.string().min(1, 'Write your password.').max(200),
});

/** The access token lives for minutes and only in memory; the renewing token is an httpOnly cookie. */
export const sessionReply = z.object({ person, accessToken: z.string(), expiresAt: moment });
export type SessionReply = z.infer<typeof sessionReply>;

export const auth = {
  signUp: endpoint({
    name: 'auth.signUp',
    method: 'POST',
    path: '/auth/sign-up',
    open: true,
    body: signUpBody,
    reply: sessionReply,
  }),
  signIn: endpoint({
    name: 'auth.signIn',
    method: 'POST',
    path: '/auth/sign-in',
    open: true,
    status: 200,
    body: signInBody,
    reply: sessionReply,
  }),
  renew: endpoint({
    name: 'auth.renew',
    method: 'POST',
    path: '/auth/renew',
    open: true,
    status: 200,
    reply: sessionReply,
  }),
  signOut: endpoint({
    name: 'auth.signOut',
    method: 'POST',
    path: '/auth/sign-out',
    open: true,
    status: 200,
    reply: z.object({}),
  }),
  me: endpoint({ name: 'auth.me', method: 'GET', path: '/auth/me', reply: person }),
};
