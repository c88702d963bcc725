import type {
  OwnMaterialSummary,
  OwnMaterialVersion,
  VersionSummary,
} from '@embertally/shared/contracts/own-materials';
import type { Actor } from '../actor.ts';
import type { FullVersionRow, OwnMaterialRow, VersionRow } from '../repositories/own-material-repository.ts';
import { storedFile, type StoredFileRow } from '../repositories/stored-file-repository.ts';

const time = (moment: Date | null): string | null => moment?.toISOString() ?? null;

/** What an answer says of a version, field by field. */
export function presentVersion(actor: Actor, row: VersionRow): VersionSummary {
  return {
    version: row.version,
    state: row.state,
    label: row.label,
    way: row.way,
    net_MJ_kg: row.net_MJ_kg,
    low_MJ_kg: row.low_MJ_kg,
    high_MJ_kg: row.high_MJ_kg,
    has_curve: row.has_curve,
    author: row.author,
    mine: row.author_id === actor.personId,
    made_at: row.made_at.toISOString(),
    edited_at: row.edited_at.toISOString(),
    put_forward_at: time(row.put_forward_at),
    decided_by: row.decided_by,
    decided_at: time(row.decided_at),
    decision_reason: row.decision_reason,
    withdrawn_by: row.withdrawn_by,
    withdrawn_at: time(row.withdrawn_at),
    withdrawal_reason: row.withdrawal_reason,
  };
}

export function presentFullVersion(
  actor: Actor,
  row: FullVersionRow,
  files: readonly StoredFileRow[],
): OwnMaterialVersion {
  return {
    ...presentVersion(actor, row),
    material_id: row.material_id,
    tag: row.tag,
    draft: row.draft,
    derived: { ...row.derived, workings: row.workings },
    evidence: files.map(storedFile),
  };
}

export function presentMaterial({ id, label, tag, in_force }: OwnMaterialRow): Omit<OwnMaterialSummary, 'latest'> {
  return { id, label, tag, in_force };
}
