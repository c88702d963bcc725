import type { FedChangeSet } from '@embertally/shared/contracts/surveys';
import type { Changes } from '@embertally/shared/survey/change';
import { SqlRepository } from './sql-repository.ts';

export interface KnownChangeSet {
  readonly survey_id: string;
  readonly sequence: number;
  readonly body_hash: string;
  readonly changes: Changes;
}

export interface NewChangeSet {
  readonly id: string;
  readonly surveyId: string;
  readonly sequence: number;
  readonly label: string;
  readonly bodyHash: string;
  readonly changes: Changes;
  readonly personId: string;
  readonly at: Date;
}

interface FeedRow {
  readonly id: string;
  readonly sequence: number;
  readonly label: string;
  readonly changes: FedChangeSet['changes'];
  readonly person_id: string;
  readonly name: string;
  readonly at: Date;
}

/** How far back the author of a clashing change is looked for. */
const AUTHORS_IN = 2000;

/** Accepted change sets: the feed of a survey. */
export class ChangeSetRepository extends SqlRepository {
  /** Locks the survey for the rest of the transaction and says where it stands. */
  lockSurvey(surveyId: string): Promise<{ readonly sequence: number } | null> {
    return this.row('SELECT sequence FROM survey WHERE id = $1 FOR UPDATE', [surveyId]);
  }

  known(id: string): Promise<KnownChangeSet | null> {
    return this.row<KnownChangeSet>('SELECT survey_id, sequence, body_hash, changes FROM change_set WHERE id = $1', [
      id,
    ]);
  }

  /**
   * Takes a set into the feed in one statement: the survey's sequence, the set, the stale marks of the rooms touched and
   * the notice to every process, which goes out with the commit.
   */
  async accept(set: NewChangeSet, staleRoomIds: readonly string[]): Promise<void> {
    await this.rows(
      `WITH raised AS (UPDATE survey SET sequence = $2, updated_at = $8 WHERE id = $1),
       fed AS (INSERT INTO change_set (survey_id, sequence, id, label, body_hash, changes, person_id, at)
         VALUES ($1, $2, $3, $4, $5, $6::json, $7, $8)),
       marked AS (INSERT INTO room_summary AS m (survey_id, room_id, standing, entries, engine, stale, mark)
         SELECT $1, room_id, 'no limit set', 0, '', true, 1 FROM unnest($9::uuid[]) AS room_id
         ON CONFLICT (survey_id, room_id) DO UPDATE SET stale = true, mark = m.mark + 1)
       SELECT pg_notify('survey_change', $1::text || ' ' || $2::text)`,
      [
        set.surveyId,
        set.sequence,
        set.id,
        set.label,
        set.bodyHash,
        JSON.stringify(set.changes),
        set.personId,
        set.at,
        staleRoomIds,
      ],
    );
  }

  /** Sets after a sequence number, oldest first. */
  async after(surveyId: string, sequence: number, limit: number): Promise<readonly FedChangeSet[]> {
    const rows = await this.rows<FeedRow>(
      `SELECT c.id, c.sequence, c.label, c.changes, c.person_id, p.name, c.at FROM change_set c
       JOIN person p ON p.id = c.person_id
       WHERE c.survey_id = $1 AND c.sequence > $2 ORDER BY c.sequence LIMIT $3`,
      [surveyId, sequence, limit],
    );
    return rows.map(({ person_id, name, ...row }) => ({ ...row, at: row.at.toISOString(), by: { person_id, name } }));
  }

  /** Who last touched a row (and a field of it, when one is named), among the last sets of the survey. */
  async lastAuthor(
    surveyId: string,
    rowId: string,
    field: string | null,
  ): Promise<{ readonly name: string; readonly at: Date } | null> {
    return this.row(
      `SELECT p.name, c.at FROM change_set c JOIN person p ON p.id = c.person_id
       CROSS JOIN LATERAL json_array_elements(c.changes) AS change
       WHERE c.survey_id = $1 AND c.sequence > (SELECT sequence FROM survey WHERE id = $1) - $4
         AND change->>'id' = $2
         AND ($3::text IS NULL OR json_typeof(change->'after') <> 'object' OR (change->'after')::jsonb ? $3)
       ORDER BY c.sequence DESC LIMIT 1`,
      [surveyId, rowId, field, AUTHORS_IN],
    );
  }
}
