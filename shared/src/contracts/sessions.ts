import { z } from 'zod/mini';
import { defineContract } from './contract.ts';

export const emailSchema = z.string().check(z.trim(), z.toLowerCase(), z.email(), z.maxLength(254));
/** Measured in bytes by the API: at most 256. The lower bound is checked on new passwords only. */
export const passwordSchema = z.string().check(z.minLength(1));

export const meSchema = z.strictObject({
  person: z.strictObject({ id: z.uuid(), name: z.string(), email: z.string(), units: z.enum(['SI', 'US']) }),
  /** The person in each organisation; `member_id` below is the one acting now. */
  members: z.array(
    z.strictObject({
      id: z.uuid(),
      organisation_id: z.uuid(),
      organisation_name: z.string(),
      role: z.enum(['admin', 'member']),
    }),
  ),
  member_id: z.uuid(),
  session: z.strictObject({ expires_at: z.iso.datetime() }),
});
export type Me = z.infer<typeof meSchema>;

export const signIn = defineContract({
  id: 'sessions.create',
  method: 'POST',
  path: '/api/sessions',
  summary: 'Sign in',
  policy: { kind: 'public', why: 'signing in is how a session begins' },
  body: z.strictObject({ email: emailSchema, password: passwordSchema }),
  response: meSchema,
  status: 201,
});

export const readCurrentSession = defineContract({
  id: 'sessions.read-current',
  method: 'GET',
  path: '/api/sessions/current',
  summary: 'Who I am and which organisation I act for',
  policy: { kind: 'signed-in' },
  response: meSchema,
  status: 200,
});

export const signOut = defineContract({
  id: 'sessions.delete-current',
  method: 'DELETE',
  path: '/api/sessions/current',
  summary: 'Sign out: the session ends on the server',
  policy: { kind: 'signed-in' },
  status: 204,
});

export const editMe = defineContract({
  id: 'people.edit-current',
  method: 'PATCH',
  path: '/api/people/current',
  summary: 'Change my name or the units I read in',
  policy: { kind: 'signed-in' },
  body: z.strictObject({
    name: z.optional(z.string().check(z.trim(), z.minLength(1), z.maxLength(120))),
    units: z.optional(z.enum(['SI', 'US'])),
  }),
  response: meSchema,
  status: 200,
});
