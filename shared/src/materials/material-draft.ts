import { z } from 'zod/mini';
import { bombDraft } from './drafts/bomb-draft.ts';
import { commonDraft } from './drafts/common-draft.ts';
import { compositionDraft } from './drafts/composition-draft.ts';
import { equationDraft } from './drafts/equation-draft.ts';
import { formulaDraft } from './drafts/formula-draft.ts';
import { supplierDraft } from './drafts/supplier-draft.ts';
import { ultimateDraft } from './drafts/ultimate-draft.ts';

/**
 * What a person states about a material of their own; everything else is derived from it by `deriveMaterial`. `way` says
 * where the heat comes from. Masses are in kg, heats in MJ or MJ/kg, shares of a mass in percent.
 */
export const materialDraftSchema = z.discriminatedUnion('way', [
  z.strictObject({ ...commonDraft, ...formulaDraft }),
  z.strictObject({ ...commonDraft, ...equationDraft }),
  z.strictObject({ ...commonDraft, ...bombDraft }),
  z.strictObject({ ...commonDraft, ...ultimateDraft }),
  z.strictObject({ ...commonDraft, ...supplierDraft }),
  z.strictObject({ ...commonDraft, ...compositionDraft }),
]);

export type MaterialDraft = z.infer<typeof materialDraftSchema>;
export type MaterialWay = MaterialDraft['way'];
/** The draft of one way: `DraftOf<'bomb'>`. */
export type DraftOf<W extends MaterialWay> = Extract<MaterialDraft, { way: W }>;
