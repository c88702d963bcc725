import type { ChangeSetBody, Changes, Clash } from '@embertally/shared/survey/change';
import { mergeChangeSet } from '@embertally/shared/survey/merge-change-set';
import { parseChanges } from '@embertally/shared/survey/parse-changes';
import { fromStored } from '@embertally/shared/survey/stored';
import { createHash } from 'node:crypto';
import type { Database, Statements } from '../repositories/database.ts';
import type { Actor } from '../actor.ts';
import type { Clock } from '../clock.ts';
import { Fault } from '../fault.ts';
import { ChangeSetRepository } from '../repositories/change-set-repository.ts';
import { DocumentRepository } from '../repositories/document-repository.ts';
import { loadTouched } from './load-touched.ts';
import { normaliseTimes } from './normalise-times.ts';
import { storeMerged } from './store-merged.ts';
import type { SummaryService } from './summary-service.ts';

export interface AcceptedChangeSet {
  readonly id: string;
  readonly sequence: number;
  readonly changes: Changes;
}

interface ChangeSetParts {
  readonly database: Database;
  readonly clock: Clock;
  readonly summaries: SummaryService;
}

/** Takes change sets into a survey, one after the other. */
export class ChangeSetService {
  private readonly parts: ChangeSetParts;

  constructor(parts: ChangeSetParts) {
    this.parts = parts;
  }

  /**
   * Applies a change set in one transaction under the lock of the survey, or nothing of it.
   * @throws Fault 409 with `clashes`, 422 when the id is known with another body or a row breaks its schema
   */
  async apply(actor: Actor, surveyId: string, body: ChangeSetBody): Promise<AcceptedChangeSet> {
    const bodyHash = createHash('sha256').update(JSON.stringify(body)).digest('hex');
    const { database, clock, summaries } = this.parts;
    const accepted = await database.transaction(async (statements) => {
      const sets = new ChangeSetRepository(statements);
      const survey = await sets.lockSurvey(surveyId);
      if (survey === null) throw Fault.notFound();
      const stored = await answerKnown(sets, surveyId, body.id, bodyHash);
      if (stored !== null) return stored;
      const parsed = parseChanges(body.changes);
      if (!parsed.ok) throw Fault.invalid(parsed.errors);
      const sent = normaliseTimes(parsed.value);
      const document = fromStored(await loadTouched(new DocumentRepository(statements), surveyId, sent));
      const merged = mergeChangeSet(document, sent);
      if (!merged.ok) throw await clashFault(statements, surveyId, merged.clashes);
      await storeMerged(new DocumentRepository(statements), document, merged.document, merged.changes);
      const sequence = survey.sequence + 1;
      await sets.accept(
        {
          id: body.id,
          surveyId,
          sequence,
          label: body.label,
          bodyHash,
          changes: merged.changes,
          personId: actor.personId,
          at: clock.now(),
        },
        merged.touchedRoomIds.filter((id) => merged.document.rooms.has(id)),
      );
      return { id: body.id, sequence, changes: merged.changes };
    });
    summaries.recomputeSoon(surveyId);
    return accepted;
  }
}

async function answerKnown(
  sets: ChangeSetRepository,
  surveyId: string,
  id: string,
  bodyHash: string,
): Promise<AcceptedChangeSet | null> {
  const known = await sets.known(id);
  if (known === null) return null;
  if (known.survey_id !== surveyId || known.body_hash !== bodyHash) {
    throw Fault.invalid(
      [{ pointer: '/id', code: 'CHANGE_SET_ID_USED', message: 'This id was used for another change set already.' }],
      'Nothing was changed. The id of the change set was used for something else already; send it with a new id.',
    );
  }
  return { id, sequence: known.sequence, changes: known.changes };
}

async function clashFault(statements: Statements, surveyId: string, clashes: readonly Clash[]): Promise<Fault> {
  const sets = new ChangeSetRepository(statements);
  const named: Clash[] = [];
  for (const clash of clashes) {
    const author = await sets.lastAuthor(surveyId, clash.id, clash.reason === 'field' ? clash.field : null);
    named.push({ ...clash, by: author?.name ?? null, at: author?.at.toISOString() ?? null });
  }
  return new Fault(
    'conflict',
    'change-set-clashes',
    `Nothing was changed. ${named[0]?.message ?? 'Somebody else changed the same thing meanwhile.'} Choose which to keep.`,
    { extra: { clashes: named } },
  );
}
