import type { z } from 'zod/mini';
import { materialDraftSchema, type MaterialDraft } from './material-draft.ts';
import type { MaterialFault } from './material-fault.ts';

export type ParsedMaterialDraft =
  | { readonly ok: true; readonly draft: MaterialDraft }
  | { readonly ok: false; readonly faults: readonly MaterialFault[] };

/** Fields by their last name; a field that is not here is called “this field”. */
const WORDS: Readonly<Record<string, string>> = {
  label: 'the name',
  source: 'where the figures are from',
  formula: 'the formula',
  formation_kJ_mol: 'the enthalpy of formation in kJ/mol',
  enthalpy_kJ: 'the enthalpy of the equation in kJ',
  heat_kJ_mol: 'the heat of one mole in kJ/mol',
  moles: 'the moles of fuel in the equation',
  water_equivalent_MJ_K: 'the water equivalent in MJ/K',
  benzoic_MJ_kg: 'the certified heat of the benzoic acid in MJ/kg',
  mass_kg: 'the mass in kg',
  rise_K: 'the corrected temperature rise in K',
  fuse_MJ: 'the heat of fuse, thread and paper in MJ',
  acid_MJ: 'the heat of the acid in MJ',
  aid_kg: 'the mass of benzoic acid added in kg',
  left_out: 'why the run does not count',
  hydrogen_pct: 'hydrogen in %',
  carbon_pct: 'carbon in %',
  oxygen_pct: 'oxygen in %',
  nitrogen_pct: 'nitrogen in %',
  sulfur_pct: 'sulfur in %',
  chlorine_pct: 'chlorine in %',
  ash_pct: 'ash in %',
  water_kg_kg: 'the condensate in kg per kg',
  pct: 'the moisture in %',
  heat_MJ: 'the heat in MJ',
  low_MJ: 'the low heat in MJ',
  high_MJ: 'the high heat in MJ',
  mass_pct: 'the share by mass in %',
  inert_pct: 'the share that does not burn in %',
  material: 'the material',
  parts: 'the materials',
  runs: 'the runs',
  density_kg_m3: 'the density in kg/m³',
  radiative_fraction: 'the radiative fraction',
  soot_yield: 'the soot yield',
  co_yield: 'the yield of carbon monoxide',
  points: 'the points of the curve',
  specimen_m2: 'the exposed area in m²',
  burnt_kg: 'the mass that burnt in kg',
};

/** Reads anything that claims to be the draft of a material and lists every field that does not fit, in plain words. */
export function parseMaterialDraft(candidate: unknown): ParsedMaterialDraft {
  const parsed = materialDraftSchema.safeParse(candidate, { reportInput: true });
  if (parsed.success) return { ok: true, draft: parsed.data };
  return { ok: false, faults: parsed.error.issues.flatMap(faultsOf) };
}

function faultsOf(issue: z.core.$ZodIssue): MaterialFault[] {
  if (issue.code === 'unrecognized_keys')
    return issue.keys.map((key) => ({
      pointer: pointerTo([...issue.path, key]),
      code: 'unknown_field',
      message: `“${key.slice(0, 80)}” does not belong to this way. Remove it.`,
    }));
  return [{ pointer: pointerTo(issue.path), code: issue.code, message: sentence(issue, wordsFor(issue.path)) }];
}

function sentence(issue: z.core.$ZodIssue, words: string): string {
  const missing = issue.input === undefined || issue.input === '';
  switch (issue.code) {
    case 'invalid_type':
      if (missing) return `Enter ${words}.`;
      return issue.expected === 'number' || issue.expected === 'int'
        ? `Enter ${words} as a number, like 12.5.`
        : `Enter ${words}.`;
    case 'too_small':
      if (issue.origin === 'string') return `Enter ${words}.`;
      if (issue.origin === 'array') return `Give at least ${issue.minimum} of ${words}.`;
      return `Enter ${words} ${issue.inclusive === false ? 'above' : 'of at least'} ${issue.minimum}.`;
    case 'too_big':
      if (issue.origin === 'string') return `Use at most ${issue.maximum} characters for ${words}.`;
      if (issue.origin === 'array') return `Give at most ${issue.maximum} of ${words}.`;
      return `Enter ${words} of at most ${issue.maximum}. Check the unit.`;
    case 'invalid_value':
      return `Choose one of: ${issue.values.map(String).join(', ')}.`;
    case 'invalid_union':
      return 'Choose what applies here.';
    default:
      return `Check ${words}.`;
  }
}

function wordsFor(path: readonly PropertyKey[]): string {
  const names = path.filter((step): step is string => typeof step === 'string');
  return WORDS[names.at(-1) ?? ''] ?? 'this field';
}

function pointerTo(path: readonly PropertyKey[]): string {
  return path.map((step) => `/${String(step).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');
}
