import type { Statements } from '../repositories/database.ts';
import type { Actor, Trail } from '../actor.ts';
import { AuditRepository, type AuditChainKey } from '../repositories/audit-repository.ts';

export type AuditFacts = Readonly<Record<string, string | number | boolean | null>>;

export interface AuditEventDraft {
  readonly chain: AuditChainKey;
  /** Null when nobody is signed in. */
  readonly actor: Actor | null;
  /** Noun and verb, as `site-role.given`. */
  readonly action: string;
  readonly object: { readonly kind: string; readonly id: string };
  readonly facts?: AuditFacts;
  readonly trail: Trail;
  readonly at: Date;
}

/** The record as it is hashed and stored. */
export interface AuditRecord {
  readonly at: string;
  readonly action: string;
  readonly by: {
    person_id: string;
    member_id: string;
    organisation_id: string;
    name: string;
    organisation_name: string;
  } | null;
  readonly object: { readonly kind: string; readonly id: string };
  readonly facts: AuditFacts;
  readonly request_id: string;
  readonly ip: string;
}

/** Events that belong to no organisation, such as a try to sign in with an address nobody has. */
export const HOUSE_CHAIN: AuditChainKey = { kind: 'house', id: '00000000-0000-0000-0000-000000000000' };

/** Adds an event in the transaction of what it tells about: both happen or neither. JSON keeps every record on one line. */
export function recordEvent(statements: Statements, draft: AuditEventDraft): Promise<void> {
  const { actor } = draft;
  const record: AuditRecord = {
    at: draft.at.toISOString(),
    action: draft.action,
    by:
      actor === null
        ? null
        : {
            person_id: actor.personId,
            member_id: actor.memberId,
            organisation_id: actor.organisationId,
            name: actor.name,
            organisation_name: actor.organisationName,
          },
    object: draft.object,
    facts: draft.facts ?? {},
    request_id: draft.trail.requestId,
    ip: draft.trail.ip,
  };
  return new AuditRepository(statements).add(draft.chain, JSON.stringify(record));
}
