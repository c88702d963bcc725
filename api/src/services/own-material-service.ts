import {
  type OwnMaterial,
  type OwnMaterialSummary,
  type OwnMaterialVersion,
  type VersionState,
} from '@embertally/shared/contracts/own-materials';
import type { MaterialDraft } from '@embertally/shared/materials/material-draft';
import { canInOrganisation } from '@embertally/shared/policy/policy';
import type { Actor, Trail } from '../actor.ts';
import type { Clock } from '../clock.ts';
import { Fault } from '../fault.ts';
import type { Database, Statements } from '../repositories/database.ts';
import {
  OwnMaterialRepository,
  type FullVersionRow,
  type OwnMaterialRow,
} from '../repositories/own-material-repository.ts';
import { StoredFileRepository } from '../repositories/stored-file-repository.ts';
import type { AccessService } from './access-service.ts';
import { attachEvidence } from './attach-evidence.ts';
import { recordEvent } from './audit-record.ts';
import { claimId } from './claim-id.ts';
import { readCursor, writeCursor } from './cursor.ts';
import { deriveOwnMaterial } from './derive-own-material.ts';
import { mustBeDraft, mustBeOwnDraft, refuseWhileOneIsOpen } from './draft-rules.ts';
import { presentFullVersion, presentMaterial, presentVersion } from './present-own-material.ts';
import { staleVersion } from './stale-version.ts';

const PAGE = 50;

export interface VersionContent {
  readonly draft: MaterialDraft;
  /** Ids of files. */
  readonly evidence: readonly string[];
}

interface ListQuery {
  readonly cursor?: string | undefined;
  readonly limit?: number | undefined;
  readonly search?: string | undefined;
  readonly state?: VersionState | undefined;
}

/** A version that is held with its material for a change. */
export interface HeldVersion {
  readonly materials: OwnMaterialRepository;
  readonly material: OwnMaterialRow;
  readonly version: FullVersionRow;
}

/** An organisation's own materials: reading, drafting and throwing drafts away. */
export class OwnMaterialService {
  private readonly database: Database;
  private readonly clock: Clock;
  private readonly access: AccessService;

  constructor(database: Database, clock: Clock, access: AccessService) {
    this.database = database;
    this.clock = clock;
    this.access = access;
  }

  async list(actor: Actor, query: ListQuery): Promise<{ items: OwnMaterialSummary[]; next_cursor: string | null }> {
    const limit = query.limit ?? PAGE;
    const found = await new OwnMaterialRepository(this.database.statements).list(actor.organisationId, {
      after: readCursor(query.cursor),
      limit: limit + 1,
      search: query.search?.trim() ?? '',
      state: query.state ?? null,
    });
    const items = found
      .slice(0, limit)
      .map(({ material, latest }) => ({ ...presentMaterial(material), latest: presentVersion(actor, latest) }));
    const last = items.at(-1);
    const more = found.length > limit && last !== undefined;
    return { items, next_cursor: more ? writeCursor([last.label.toLowerCase(), last.id]) : null };
  }

  async read(actor: Actor, materialId: string): Promise<OwnMaterial> {
    const materials = new OwnMaterialRepository(this.database.statements);
    const material = await materials.find(actor.organisationId, materialId);
    if (material === null) throw Fault.notFound();
    const versions = await materials.versions(materialId);
    return { ...presentMaterial(material), versions: versions.map((row) => presentVersion(actor, row)) };
  }

  async readVersion(actor: Actor, materialId: string, version: number): Promise<OwnMaterialVersion> {
    const { statements } = this.database;
    const row = await new OwnMaterialRepository(statements).version(actor.organisationId, materialId, version);
    if (row === null) throw Fault.notFound();
    return presentFullVersion(actor, row, await new StoredFileRepository(statements).ofVersion(row.id));
  }

  /** Makes a material with its first version; both have the client's id. */
  async create(
    actor: Actor,
    input: VersionContent & { readonly id: string },
    trail: Trail,
  ): Promise<OwnMaterialVersion> {
    const { id, draft } = input;
    const at = this.clock.now();
    await this.database.transaction(async (statements) => {
      if (!(await claimId(statements, actor, input, at))) return;
      await new OwnMaterialRepository(statements).add(id, actor.organisationId, draft.label, at);
      await this.addVersion(statements, actor, { ...input, materialId: id, version: 1 }, trail, at);
    });
    return this.readVersion(actor, id, 1);
  }

  /** Makes the next version; while one is a draft or waits for a decision there is no other. */
  async createVersion(
    actor: Actor,
    materialId: string,
    input: VersionContent & { readonly id: string },
    trail: Trail,
  ): Promise<OwnMaterialVersion> {
    const at = this.clock.now();
    const number = await this.database.transaction(async (statements) => {
      const materials = new OwnMaterialRepository(statements);
      const material = await materials.hold(actor.organisationId, materialId);
      if (material === null) throw Fault.notFound();
      if (!(await claimId(statements, actor, input, at))) return materials.numberOf(input.id);
      await refuseWhileOneIsOpen(materials, actor, material);
      const version = material.latest + 1;
      await this.addVersion(statements, actor, { ...input, materialId, version }, trail, at);
      await materials.touch(materialId, { ...material, label: input.draft.label, latest: version });
      return version;
    });
    if (number === null) {
      throw new Fault(
        'conflict',
        'draft-gone',
        'This draft was made and thrown away already; nothing was changed. Send it with a new id.',
      );
    }
    return this.readVersion(actor, materialId, number);
  }

  async edit(
    actor: Actor,
    materialId: string,
    version: number,
    tag: number,
    content: VersionContent,
    trail: Trail,
  ): Promise<OwnMaterialVersion> {
    const at = this.clock.now();
    await this.changing(actor, trail, async (statements) => {
      const held = await this.hold(statements, actor, materialId, version, tag);
      mustBeOwnDraft(held.version, actor, 'changed');
      const derived = await deriveOwnMaterial(statements, actor.organisationId, content.draft);
      await held.materials.setContent(held.version.id, content.draft, derived, at);
      await attachEvidence(statements, actor, held.version.id, content.evidence);
      await held.materials.touch(materialId, { ...held.material, label: content.draft.label });
      await this.record(
        statements,
        actor,
        'material.edited',
        materialId,
        { version, label: content.draft.label },
        trail,
        at,
      );
    });
    return this.readVersion(actor, materialId, version);
  }

  /** Throws a draft away: one's own, or as an admin another member's. */
  async discard(actor: Actor, materialId: string, version: number, tag: number, trail: Trail): Promise<void> {
    const at = this.clock.now();
    await this.changing(actor, trail, async (statements) => {
      const held = await this.hold(statements, actor, materialId, version, tag);
      if (!canInOrganisation(actor.organisationRole, 'material.discard-of-others')) {
        mustBeOwnDraft(held.version, actor, 'thrown away');
      } else mustBeDraft(held.version, 'thrown away');
      await held.materials.removeVersion(held.version.id);
      const before = (await held.materials.versions(materialId))[0];
      if (before === undefined) await held.materials.remove(materialId);
      else await held.materials.touch(materialId, { ...held.material, label: before.label, latest: before.version });
      await this.record(
        statements,
        actor,
        'material.draft-discarded',
        materialId,
        { version, label: held.version.label },
        trail,
        at,
      );
    });
  }

  /** All of the work or nothing of it; a refusal because of who is acting is written down. */
  async changing(actor: Actor, trail: Trail, work: (statements: Statements) => Promise<void>): Promise<void> {
    try {
      await this.database.transaction(work);
    } catch (error) {
      if (error instanceof Fault && error.kind === 'forbidden') {
        await this.access.refusedInOrganisation(actor, error.code, trail);
      }
      throw error;
    }
  }

  /**
   * Holds a version and its material until the transaction ends.
   * @throws Fault 404; 412 with the version as it is now when the material changed after it was read
   */
  async hold(
    statements: Statements,
    actor: Actor,
    materialId: string,
    version: number,
    tag: number | null,
  ): Promise<HeldVersion> {
    const materials = new OwnMaterialRepository(statements);
    const material = await materials.hold(actor.organisationId, materialId);
    const row = material === null ? null : await materials.version(actor.organisationId, materialId, version);
    if (material === null || row === null) throw Fault.notFound();
    if (tag !== null && material.tag !== tag) throw staleVersion({ ...presentVersion(actor, row), tag: material.tag });
    return { materials, material, version: row };
  }

  record(
    statements: Statements,
    actor: Actor,
    action: string,
    materialId: string,
    facts: Readonly<Record<string, string | number>>,
    trail: Trail,
    at: Date,
  ): Promise<void> {
    const chain = { kind: 'organisation', id: actor.organisationId } as const;
    return recordEvent(statements, {
      chain,
      actor,
      action,
      object: { kind: 'material', id: materialId },
      facts,
      trail,
      at,
    });
  }

  private async addVersion(
    statements: Statements,
    actor: Actor,
    input: VersionContent & { readonly id: string; readonly materialId: string; readonly version: number },
    trail: Trail,
    at: Date,
  ): Promise<void> {
    const { id, materialId, version, draft } = input;
    const derived = await deriveOwnMaterial(statements, actor.organisationId, draft);
    const row = { id, material_id: materialId, version, draft, derived, author_id: actor.personId, at };
    await new OwnMaterialRepository(statements).addVersion(row);
    await attachEvidence(statements, actor, id, input.evidence);
    const facts = { version, label: draft.label, way: draft.way, net_MJ_kg: derived.net_MJ_kg };
    await this.record(statements, actor, 'material.drafted', materialId, facts, trail, at);
  }
}
