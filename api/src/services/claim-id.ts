import type { Statements } from '../repositories/database.ts';
import type { Actor } from '../actor.ts';
import { Fault } from '../fault.ts';
import { CreationRepository } from '../repositories/creation-repository.ts';

/**
 * Claims a client-made id for a creation in this transaction.
 * @returns whether it is new; false when the same person sent the same body before and gets the stored answer
 * @throws Fault 409 when the id was used for something else
 */
export async function claimId(
  statements: Statements,
  actor: Actor,
  body: { readonly id: string },
  at: Date,
): Promise<boolean> {
  const outcome = await new CreationRepository(statements).claim(body.id, actor.personId, body, at);
  if (outcome === 'other') {
    throw new Fault(
      'conflict',
      'id-taken',
      'This id has been used for something else already; nothing was changed. Send it with a new id.',
    );
  }
  return outcome === 'new';
}
