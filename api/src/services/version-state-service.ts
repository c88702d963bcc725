import type { OwnMaterialVersion, VersionState } from '@embertally/shared/contracts/own-materials';
import type { Actor, Trail } from '../actor.ts';
import type { Clock } from '../clock.ts';
import { Fault } from '../fault.ts';
import type { Statements } from '../repositories/database.ts';
import type { FullVersionRow } from '../repositories/own-material-repository.ts';
import { deriveOwnMaterial, partsStand } from './derive-own-material.ts';
import { mustBeOwnDraft } from './draft-rules.ts';
import type { HeldVersion, OwnMaterialService } from './own-material-service.ts';

interface StateParts {
  readonly clock: Clock;
  readonly ownMaterials: OwnMaterialService;
}

export type WantedState =
  | { readonly state: 'put-forward' }
  | { readonly state: 'approved' }
  | { readonly state: 'returned'; readonly reason: string }
  | { readonly state: 'withdrawn'; readonly reason: string };

interface Step {
  readonly statements: Statements;
  readonly held: HeldVersion;
  readonly actor: Actor;
  readonly trail: Trail;
  readonly at: Date;
}

const WORDS: Readonly<Record<VersionState, string>> = {
  draft: 'is still a draft',
  'put-forward': 'waits for a decision',
  approved: 'is approved',
  returned: 'was returned',
  withdrawn: 'is withdrawn',
};

/** How a version goes from draft to use and out of it again. Nobody approves what they wrote. */
export class VersionStateService {
  private readonly parts: StateParts;

  constructor(parts: StateParts) {
    this.parts = parts;
  }

  async move(
    actor: Actor,
    materialId: string,
    version: number,
    tag: number,
    wanted: WantedState,
    trail: Trail,
  ): Promise<OwnMaterialVersion> {
    const { clock, ownMaterials } = this.parts;
    const at = clock.now();
    await ownMaterials.changing(actor, trail, async (statements) => {
      const found = await ownMaterials.hold(statements, actor, materialId, version, null);
      if (isDone(found.version, actor, wanted)) return;
      const held = await ownMaterials.hold(statements, actor, materialId, version, tag);
      await this.step({ statements, held, actor, trail, at }, wanted);
    });
    return ownMaterials.readVersion(actor, materialId, version);
  }

  private async step(step: Step, wanted: WantedState): Promise<void> {
    switch (wanted.state) {
      case 'put-forward':
        return this.putForward(step);
      case 'approved':
        return this.approve(step);
      case 'returned':
        return this.giveBack(step, wanted.reason);
      case 'withdrawn':
        return this.withdraw(step, wanted.reason);
    }
  }

  /** Derived once more: what is decided about is what the methods of today give. */
  private async putForward({ statements, held, actor, trail, at }: Step): Promise<void> {
    const { materials, material, version } = held;
    mustBeOwnDraft(version, actor, 'put forward');
    const derived = await deriveOwnMaterial(statements, actor.organisationId, version.draft);
    await materials.putForward(version.id, derived, at);
    await materials.touch(material.id, material);
    const facts = { version: version.version, label: version.label, net_MJ_kg: derived.net_MJ_kg };
    await this.parts.ownMaterials.record(statements, actor, 'material.put-forward', material.id, facts, trail, at);
  }

  private async approve({ statements, held, actor, trail, at }: Step): Promise<void> {
    const { materials, material, version } = held;
    mustBe(version, 'put-forward', 'approved');
    if (version.author_id === actor.personId) {
      throw new Fault(
        'forbidden',
        'own-version',
        'You wrote this version, so another member of your organisation has to approve it; nothing was changed.',
      );
    }
    if (!(await partsStand(statements, actor.organisationId, version.draft))) {
      throw new Fault(
        'conflict',
        'part-withdrawn',
        'A material this one is made of has been withdrawn meanwhile; nothing was approved. Return it, so that its author can make it of others.',
      );
    }
    await materials.decide(version.id, { state: 'approved', by: actor.personId, reason: null, at });
    await materials.touch(material.id, { ...material, in_force: version.version });
    const facts = { version: version.version, label: version.label, net_MJ_kg: version.net_MJ_kg };
    await this.parts.ownMaterials.record(statements, actor, 'material.approved', material.id, facts, trail, at);
  }

  /** By its author too: that is taking it back. */
  private async giveBack({ statements, held, actor, trail, at }: Step, reason: string): Promise<void> {
    const { materials, material, version } = held;
    mustBe(version, 'put-forward', 'returned');
    await materials.decide(version.id, { state: 'returned', by: actor.personId, reason, at });
    await materials.touch(material.id, material);
    const facts = { version: version.version, label: version.label, reason };
    await this.parts.ownMaterials.record(statements, actor, 'material.returned', material.id, facts, trail, at);
  }

  /** With every approved version before it: an older value must not come back because a newer one was wrong. */
  private async withdraw({ statements, held, actor, trail, at }: Step, reason: string): Promise<void> {
    const { materials, material, version } = held;
    mustBe(version, 'approved', 'withdrawn');
    if (material.in_force !== version.version) {
      throw new Fault(
        'conflict',
        'version-not-in-force',
        `Version ${String(material.in_force)} is in force, not version ${version.version}; nothing was changed. Withdraw the one in force.`,
      );
    }
    await materials.withdraw(material.id, version.version, { by: actor.personId, reason, at });
    await materials.touch(material.id, { ...material, in_force: null });
    const facts = { version: version.version, label: version.label, reason };
    await this.parts.ownMaterials.record(statements, actor, 'material.withdrawn', material.id, facts, trail, at);
  }
}

/** Whether the same person has done this already and only the answer was lost. */
function isDone(version: FullVersionRow, actor: Actor, { state }: WantedState): boolean {
  if (version.state !== state) return false;
  const by = {
    'put-forward': version.author_id,
    approved: version.decided_by_id,
    returned: version.decided_by_id,
    withdrawn: version.withdrawn_by_id,
  }[state];
  return by === actor.personId;
}

function mustBe({ version, state }: FullVersionRow, wanted: VersionState, done: string): void {
  if (state === wanted) return;
  throw new Fault(
    'conflict',
    'version-state',
    `Version ${version} ${WORDS[state]}, so it cannot be ${done}; nothing was changed.`,
  );
}
