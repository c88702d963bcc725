import { z } from 'zod/mini';
import type { DerivedMaterial } from '../materials/derived-material.ts';
import { materialDraftSchema } from '../materials/material-draft.ts';
import { defineContract } from './contract.ts';
import { storedFileSchema } from './files.ts';

/**
 * A version begins as a draft of its author. Put forward, it never changes again; another member of the organisation
 * approves or returns it. Only approved versions are placed, by anybody. Withdrawn, it is placed no longer; entries keep
 * what they have.
 */
export const versionStateSchema = z.enum(['draft', 'put-forward', 'approved', 'returned', 'withdrawn']);
export type VersionState = z.infer<typeof versionStateSchema>;

/** Most versions of one material, files with one version. */
export const MOST_VERSIONS = 500;
export const MOST_EVIDENCE = 10;

const versionFields = {
  version: z.int(),
  state: versionStateSchema,
  label: z.string(),
  way: z.string(),
  net_MJ_kg: z.number(),
  low_MJ_kg: z.number(),
  high_MJ_kg: z.number(),
  has_curve: z.boolean(),
  author: z.string(),
  /** Whether the reader is its author, who may change and put it forward but not approve it. */
  mine: z.boolean(),
  made_at: z.iso.datetime(),
  edited_at: z.iso.datetime(),
  put_forward_at: z.nullable(z.iso.datetime()),
  /** Who approved or returned it, when, and why it was returned. */
  decided_by: z.nullable(z.string()),
  decided_at: z.nullable(z.iso.datetime()),
  decision_reason: z.nullable(z.string()),
  withdrawn_by: z.nullable(z.string()),
  withdrawn_at: z.nullable(z.iso.datetime()),
  withdrawal_reason: z.nullable(z.string()),
};
export const versionSummarySchema = z.strictObject(versionFields);
export type VersionSummary = z.infer<typeof versionSummarySchema>;

const materialFields = {
  id: z.uuid(),
  /** Name of the version made last. */
  label: z.string(),
  /** Rises with every change of the material or one of its versions; sent as If-Match. */
  tag: z.int(),
  /** The version that may be placed; null while there is none. */
  in_force: z.nullable(z.int()),
};
export const ownMaterialSummarySchema = z.strictObject({ ...materialFields, latest: versionSummarySchema });
export type OwnMaterialSummary = z.infer<typeof ownMaterialSummarySchema>;

export const ownMaterialSchema = z.strictObject({
  ...materialFields,
  /** Newest first. */
  versions: z.array(versionSummarySchema),
});
export type OwnMaterial = z.infer<typeof ownMaterialSchema>;

export const ownMaterialVersionSchema = z.strictObject({
  ...versionFields,
  material_id: z.uuid(),
  tag: z.int(),
  draft: materialDraftSchema,
  /** What the server derived from the draft, workings included; their shape is the business of `shared/src/materials`. */
  derived: z.custom<DerivedMaterial>((value) => typeof value === 'object' && value !== null && 'net_MJ_kg' in value),
  evidence: z.array(storedFileSchema),
});
export type OwnMaterialVersion = z.infer<typeof ownMaterialVersionSchema>;

const materialId = z.strictObject({ materialId: z.uuid() });
const versionId = z.strictObject({
  materialId: z.uuid(),
  version: z.coerce.number().check(z.int(), z.minimum(1), z.maximum(MOST_VERSIONS)),
});
/** Ids of files of one's own organisation that show where the figures come from. */
const evidence = z.array(z.uuid()).check(z.maxLength(MOST_EVIDENCE));
const versionBody = { draft: materialDraftSchema, evidence };
const BODY_BYTES = 256 * 1024;

export const listOwnMaterials = defineContract({
  id: 'own-materials.list',
  method: 'GET',
  path: '/api/own-materials',
  summary: 'Materials of one’s own organisation with the version made last, by name',
  policy: { kind: 'organisation', action: 'material.read' },
  query: z.strictObject({
    cursor: z.optional(z.string().check(z.maxLength(600))),
    limit: z.optional(z.coerce.number().check(z.int(), z.minimum(1), z.maximum(100))),
    /** Part of a name, as typed. */
    search: z.optional(z.string().check(z.maxLength(100))),
    /** State of the version made last. */
    state: z.optional(versionStateSchema),
  }),
  response: z.strictObject({ items: z.array(ownMaterialSummarySchema), next_cursor: z.nullable(z.string()) }),
  status: 200,
});

export const createOwnMaterial = defineContract({
  id: 'own-materials.create',
  method: 'POST',
  path: '/api/own-materials',
  summary: 'Make a material; its first version is a draft',
  policy: { kind: 'organisation', action: 'material.write' },
  body: z.strictObject({ id: z.uuid(), ...versionBody }),
  maxBodyBytes: BODY_BYTES,
  response: ownMaterialVersionSchema,
  status: 201,
  costly: true,
});

export const readOwnMaterial = defineContract({
  id: 'own-materials.read',
  method: 'GET',
  path: '/api/own-materials/:materialId',
  summary: 'One material with its versions',
  policy: { kind: 'organisation', action: 'material.read' },
  params: materialId,
  response: ownMaterialSchema,
  status: 200,
});

export const createVersion = defineContract({
  id: 'own-material-versions.create',
  method: 'POST',
  path: '/api/own-materials/:materialId/versions',
  summary: 'Make the next version of a material, as a draft',
  policy: { kind: 'organisation', action: 'material.write' },
  params: materialId,
  body: z.strictObject({ id: z.uuid(), ...versionBody }),
  maxBodyBytes: BODY_BYTES,
  response: ownMaterialVersionSchema,
  status: 201,
  costly: true,
});

export const readVersion = defineContract({
  id: 'own-material-versions.read',
  method: 'GET',
  path: '/api/own-materials/:materialId/versions/:version',
  summary: 'One version with its draft, workings and evidence',
  policy: { kind: 'organisation', action: 'material.read' },
  params: versionId,
  response: ownMaterialVersionSchema,
  status: 200,
});

export const editVersion = defineContract({
  id: 'own-material-versions.edit',
  method: 'PUT',
  path: '/api/own-materials/:materialId/versions/:version',
  summary: 'Change one’s own draft',
  policy: { kind: 'organisation', action: 'material.write' },
  params: versionId,
  body: z.strictObject(versionBody),
  maxBodyBytes: BODY_BYTES,
  response: ownMaterialVersionSchema,
  status: 200,
  ifMatch: true,
  costly: true,
});

export const discardVersion = defineContract({
  id: 'own-material-versions.discard',
  method: 'DELETE',
  path: '/api/own-materials/:materialId/versions/:version',
  summary: 'Throw a draft away; a material without any other version goes with it',
  policy: { kind: 'organisation', action: 'material.write' },
  params: versionId,
  status: 204,
  ifMatch: true,
});

const reason = z.string().check(z.trim(), z.minLength(1), z.maxLength(1000));

/** Sending the state a version has already been given by the same person changes nothing and gives the stored answer. */
export const moveVersion = defineContract({
  id: 'own-material-versions.move',
  method: 'PUT',
  path: '/api/own-materials/:materialId/versions/:version/state',
  summary:
    'Put a draft forward, approve or return what was put forward, or withdraw the version in force and all before it',
  policy: { kind: 'organisation', action: 'material.decide' },
  params: versionId,
  body: z.discriminatedUnion('state', [
    z.strictObject({ state: z.literal('put-forward') }),
    z.strictObject({ state: z.literal('approved') }),
    z.strictObject({ state: z.literal('returned'), reason }),
    z.strictObject({ state: z.literal('withdrawn'), reason }),
  ]),
  response: ownMaterialVersionSchema,
  status: 200,
  ifMatch: true,
});
