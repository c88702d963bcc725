import type { Limit } from '@embertally/shared/contracts/limits';
import type { SurveyDocumentV2 } from '@embertally/shared/survey/versions/v2';

/** A limit as a report prints it: the bound, who set it, where it stands and since when. */
export type ReportLimit = Pick<Limit, 'room_id' | 'quantity' | 'bound' | 'source' | 'set_by' | 'since'>;

/**
 * Everything a report is made from, as plain data that can be sent to another thread. The same input always gives the
 * same bytes: names, moment and time zone come in, nothing is read from a clock or a database.
 */
export interface ReportInput {
  readonly kind: 'survey-report' | 'room-tally';
  /** The room of a `room-tally`; null for a whole survey. */
  readonly room_id: string | null;
  readonly site: string;
  readonly building: string;
  /** The person who asked for it, by the name shown to others. */
  readonly made_by: string;
  /** ISO 8601, UTC. */
  readonly made_at: string;
  /** IANA name of the site's time zone: dates are printed as that site's days. */
  readonly time_zone: string;
  readonly units: 'SI' | 'US';
  readonly document: SurveyDocumentV2;
  /** Limits of the building; those of rooms not in the document are left out. */
  readonly limits: readonly ReportLimit[];
}
