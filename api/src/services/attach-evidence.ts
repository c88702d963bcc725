import type { Actor } from '../actor.ts';
import { Fault } from '../fault.ts';
import type { Statements } from '../repositories/database.ts';
import { OwnMaterialRepository } from '../repositories/own-material-repository.ts';
import { StoredFileRepository } from '../repositories/stored-file-repository.ts';

/**
 * Makes files of the organisation the evidence of a draft; none of them can go before the transaction ends.
 * @throws Fault 422 for a file that is not there
 */
export async function attachEvidence(
  statements: Statements,
  actor: Actor,
  versionId: string,
  ids: readonly string[],
): Promise<void> {
  const wanted = [...new Set(ids.map((id) => id.toLowerCase()))];
  const there = await new StoredFileRepository(statements).hold(actor.organisationId, wanted);
  const faults = wanted.flatMap((id, at) =>
    there.has(id)
      ? []
      : [
          {
            pointer: `/evidence/${at}`,
            code: 'FILE_UNKNOWN',
            message:
              'This file is not on the server; attach it again. What was not saved with its material goes after a day.',
          },
        ],
  );
  if (faults.length > 0) throw Fault.invalid(faults);
  await new OwnMaterialRepository(statements).setEvidence(versionId, wanted);
}
