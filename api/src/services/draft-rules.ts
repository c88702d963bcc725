import { MOST_VERSIONS } from '@embertally/shared/contracts/own-materials';
import type { Actor } from '../actor.ts';
import { Fault } from '../fault.ts';
import type { FullVersionRow, OwnMaterialRepository, OwnMaterialRow } from '../repositories/own-material-repository.ts';

/** @throws Fault 409 while the version made last is a draft or waits for a decision, and when there are too many */
export async function refuseWhileOneIsOpen(
  materials: OwnMaterialRepository,
  actor: Actor,
  { id, latest }: OwnMaterialRow,
): Promise<void> {
  const last = await materials.version(actor.organisationId, id, latest);
  if (last?.state === 'draft' || last?.state === 'put-forward') {
    const doing = last.state === 'draft' ? 'is still being drafted' : 'waits for a decision';
    throw new Fault(
      'conflict',
      'version-open',
      `Version ${latest} by ${last.author} ${doing}; nothing was made. Finish it first, then make the next one.`,
    );
  }
  if (latest >= MOST_VERSIONS) {
    throw new Fault(
      'conflict',
      'too-many-versions',
      `A material has at most ${MOST_VERSIONS} versions; make a new material.`,
    );
  }
}

/** @throws Fault 409 for a version that is no draft any more */
export function mustBeDraft({ version, state }: FullVersionRow, done: string): void {
  if (state === 'draft') return;
  throw new Fault(
    'conflict',
    'version-not-draft',
    `Version ${version} has been put forward and is not ${done} any more; nothing was changed. Make the next version instead.`,
  );
}

/** @throws Fault 409 for a version that is no draft any more, 403 for somebody else's */
export function mustBeOwnDraft(version: FullVersionRow, actor: Actor, done: string): void {
  mustBeDraft(version, done);
  if (version.author_id === actor.personId) return;
  throw new Fault(
    'forbidden',
    'draft-of-another',
    `This draft is ${version.author}’s and can only be ${done} by them; nothing was changed. Make the next version once it is decided.`,
  );
}
