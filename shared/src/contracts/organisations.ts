import { z } from 'zod/mini';
import { defineContract } from './contract.ts';
import { emailSchema, passwordSchema } from './sessions.ts';

/**
 * Sign up: makes the organisation and its first member, an admin. The answer is the same whether or not the address
 * already has an account, so that nobody can find out who has one; the client then signs in with what was typed.
 */
export const signUp = defineContract({
  id: 'organisations.create',
  method: 'POST',
  path: '/api/organisations',
  summary: 'Sign up: make an organisation and its first member',
  policy: { kind: 'public', why: 'signing up is how a person gets in' },
  body: z.strictObject({
    id: z.uuid(),
    organisation_name: z.string().check(z.trim(), z.minLength(2), z.maxLength(120)),
    name: z.string().check(z.trim(), z.minLength(1), z.maxLength(120)),
    email: emailSchema,
    password: passwordSchema,
  }),
  response: z.strictObject({ accepted: z.literal(true) }),
  status: 202,
});
