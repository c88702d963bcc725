import type { EntityKind } from '@embertally/shared/survey/survey-document';
import type { SurveyDocumentV2 } from '@embertally/shared/survey/versions/v2';
import { columnDefinitions, columnNames, documentColumns } from './row-columns.ts';
import { SqlRepository } from './sql-repository.ts';

const list = (kind: EntityKind, where: string): string =>
  `coalesce((SELECT json_agg(t) FROM (SELECT ${documentColumns(kind)} FROM "${kind}" WHERE survey_id = $1 AND ${where} ORDER BY id) t), '[]'::json)`;

const documentSql = (where: Readonly<Record<EntityKind, string>>): string => `
  SELECT json_build_object('schema_version', 2, 'survey_id', v.id, 'sequence', v.sequence,
    'storeys', ${list('storey', where.storey)}, 'corners', ${list('corner', where.corner)},
    'rooms', ${list('room', where.room)}, 'openings', ${list('opening', where.opening)},
    'entries', ${list('entry', where.entry)})::text AS document
  FROM survey v WHERE v.id = $1`;

const EVERYTHING = documentSql({ storey: 'true', corner: 'true', room: 'true', opening: 'true', entry: 'true' });

/** Rooms ($2) with what bounds them and some entries ($3): all that a change to contents touches. */
const CORNERS_OF_ROOMS = `id IN (
  SELECT corner_id::uuid FROM room r CROSS JOIN LATERAL (
    SELECT jsonb_array_elements_text(r.ring) AS corner_id
    UNION ALL SELECT jsonb_array_elements_text(hole) FROM jsonb_array_elements(r.holes) AS hole) ids
  WHERE r.survey_id = $1 AND r.id = ANY($2::uuid[]))`;
const CONTENTS = documentSql({
  storey: 'id IN (SELECT storey_id FROM room WHERE survey_id = $1 AND id = ANY($2::uuid[]))',
  corner: CORNERS_OF_ROOMS,
  room: 'id = ANY($2::uuid[])',
  opening: 'false',
  entry: 'id = ANY($3::uuid[])',
});

/** Storeys ($2) whole, with some entries ($3), or all of them ($4). */
const OF_STOREYS = 'storey_id = ANY($2::uuid[])';
const STOREYS = documentSql({
  storey: 'id = ANY($2::uuid[])',
  corner: OF_STOREYS,
  room: OF_STOREYS,
  opening: OF_STOREYS,
  entry: `(id = ANY($3::uuid[]) OR ($4::boolean AND room_id IN (SELECT id FROM room WHERE survey_id = $1 AND ${OF_STOREYS})))`,
});

/** Storeys of some rooms ($2) whole, with the entries of those rooms: all that their tallies need. */
const STOREYS_OF_ROOMS = 'storey_id IN (SELECT storey_id FROM room WHERE survey_id = $1 AND id = ANY($2::uuid[]))';
const TALLIES = documentSql({
  storey: 'id IN (SELECT storey_id FROM room WHERE survey_id = $1 AND id = ANY($2::uuid[]))',
  corner: STOREYS_OF_ROOMS,
  room: STOREYS_OF_ROOMS,
  opening: STOREYS_OF_ROOMS,
  entry: 'room_id = ANY($2::uuid[])',
});

export interface TouchedIds {
  readonly storey: readonly string[];
  readonly corner: readonly string[];
  readonly room: readonly string[];
  readonly opening: readonly string[];
  readonly entry: readonly string[];
}

/** The rows of a survey, read as JSON that PostgreSQL writes and written a kind at a time. */
export class DocumentRepository extends SqlRepository {
  /** The whole document as JSON text; null when there is no such survey. */
  async text(surveyId: string): Promise<string | null> {
    return (await this.row<{ document: string }>(EVERYTHING, [surveyId]))?.document ?? null;
  }

  /** The rooms entries are in or go to, with their corners, and the entries themselves. */
  contents(surveyId: string, roomIds: readonly string[], entryIds: readonly string[]): Promise<SurveyDocumentV2> {
    return this.read(CONTENTS, [surveyId, roomIds, entryIds]);
  }

  /** Whole storeys, with the entries named, or with all entries in them. */
  storeys(
    surveyId: string,
    storeyIds: readonly string[],
    entryIds: readonly string[],
    allEntries: boolean,
  ): Promise<SurveyDocumentV2> {
    return this.read(STOREYS, [surveyId, storeyIds, entryIds, allEntries]);
  }

  /** What the tallies of some rooms need. */
  forTallies(surveyId: string, roomIds: readonly string[]): Promise<SurveyDocumentV2> {
    return this.read(TALLIES, [surveyId, roomIds]);
  }

  /** The rooms in which stored entries are. */
  async roomsOfEntries(surveyId: string, entryIds: readonly string[]): Promise<readonly string[]> {
    const rows = await this.rows<{ room_id: string }>(
      'SELECT DISTINCT room_id FROM entry WHERE survey_id = $1 AND id = ANY($2::uuid[])',
      [surveyId, entryIds],
    );
    return rows.map((row) => row.room_id);
  }

  /** The storeys on which stored rows stand. */
  async storeysOf(surveyId: string, ids: TouchedIds, roomIds: readonly string[]): Promise<readonly string[]> {
    const rows = await this.rows<{ storey_id: string }>(
      `SELECT storey_id FROM corner WHERE survey_id = $1 AND id = ANY($2::uuid[])
       UNION SELECT storey_id FROM room WHERE survey_id = $1 AND id = ANY($3::uuid[])
       UNION SELECT storey_id FROM opening WHERE survey_id = $1 AND id = ANY($4::uuid[])
       UNION SELECT r.storey_id FROM entry e JOIN room r ON r.survey_id = e.survey_id AND r.id = e.room_id
         WHERE e.survey_id = $1 AND e.id = ANY($5::uuid[])`,
      [surveyId, ids.corner, [...ids.room, ...roomIds], ids.opening, ids.entry],
    );
    return rows.map((row) => row.storey_id);
  }

  async insert(surveyId: string, kind: EntityKind, rows: readonly object[]): Promise<void> {
    if (rows.length === 0) return;
    await this.rows(
      `INSERT INTO "${kind}" (survey_id, version, ${columnNames(kind)})
       SELECT $1, 1, ${columnNames(kind, 'r.')} FROM jsonb_to_recordset($2::jsonb) AS r(${columnDefinitions(kind)})`,
      [surveyId, JSON.stringify(rows)],
    );
  }

  async update(surveyId: string, kind: EntityKind, rows: readonly object[]): Promise<void> {
    if (rows.length === 0) return;
    await this.rows(
      `UPDATE "${kind}" AS t SET (version, ${columnNames(kind)}) = ROW(t.version + 1, ${columnNames(kind, 'r.')})
       FROM jsonb_to_recordset($2::jsonb) AS r(${columnDefinitions(kind)}) WHERE t.survey_id = $1 AND t.id = r.id`,
      [surveyId, JSON.stringify(rows)],
    );
  }

  async remove(surveyId: string, kind: EntityKind, ids: readonly string[]): Promise<void> {
    if (ids.length === 0) return;
    await this.rows(`DELETE FROM "${kind}" WHERE survey_id = $1 AND id = ANY($2::uuid[])`, [surveyId, ids]);
  }

  private async read(sql: string, values: readonly unknown[]): Promise<SurveyDocumentV2> {
    const found = await this.row<{ document: string }>(sql, values);
    if (found === null) throw new Error('The survey went away inside its own transaction.');
    return JSON.parse(found.document) as SurveyDocumentV2;
  }
}
