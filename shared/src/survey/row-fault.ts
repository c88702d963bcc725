import type { z } from 'zod/mini';
import type { Refusal } from './command.ts';
import { refuse } from './refuse.ts';
import { patchSchemas, rowSchemas } from './row-schemas.ts';
import type { EntityKind } from './survey-document.ts';

const UNITS: readonly (readonly [suffix: string, unit: string])[] = [
  ['_W_mK', 'W/(m·K)'],
  ['_kg_m3', 'kg/m³'],
  ['_J_kgK', 'J/(kg·K)'],
  ['_kW_m2', 'kW/m²'],
  ['_MJ_kg', 'MJ/kg'],
  ['_kg', 'kg'],
  ['_m2', 'm²'],
  ['_kW', 'kW'],
  ['_pct', '%'],
  ['_deg', '°'],
  ['_min', 'min'],
  ['_C', '°C'],
  ['_m', 'm'],
];

/** Field names whose words are not just the name without its unit. */
const WORDS: Readonly<Record<string, string>> = {
  x_m: 'position from the left',
  y_m: 'position from the bottom',
  offset_m: 'distance from the corner',
  sill_m: 'sill height',
  net_heat_MJ_kg: 'net heat',
  low_MJ_kg: 'low heat',
  high_MJ_kg: 'high heat',
  rti: 'response time index',
  parts: 'parts',
  ring: 'corners',
};

export interface RowFault {
  /** JSON pointer within the row: `/parts/0/mass_kg`. */
  readonly pointer: string;
  /** The last field name on the way, without positions in lists. */
  readonly field: string;
  readonly message: string;
}

/** Everything about a whole row that does not fit its schema, each in one sentence. */
export function rowFaults(kind: EntityKind, row: unknown): RowFault[] {
  return faultsOf(rowSchemas[kind], row);
}

/** Everything about an edit's fields that does not fit the schema of its kind. */
export function patchFaults(kind: EntityKind, patch: unknown): RowFault[] {
  return faultsOf(patchSchemas[kind], patch);
}

/** The first fault as a command's refusal at its field; null for a row that fits. */
export function rowRefusal(kind: EntityKind, row: { readonly id: string }): Refusal | null {
  const [fault] = rowFaults(kind, row);
  return fault === undefined
    ? null
    : refuse('FIELD_OUT_OF_RANGE', fault.message, { field: fault.field, ids: [row.id] });
}

function faultsOf(schema: z.core.$ZodType, value: unknown): RowFault[] {
  const parsed = (schema as z.ZodMiniType).safeParse(value);
  return parsed.success ? [] : parsed.error.issues.map((issue) => faultOf(issue, value));
}

function faultOf(issue: z.core.$ZodIssue, value: unknown): RowFault {
  const path = issue.path.map(String);
  const names = path.filter((step) => !/^\d+$/.test(step));
  const field = names.at(-1) ?? '';
  const found = path.reduce<unknown>(
    (inside, step) =>
      typeof inside === 'object' && inside !== null ? (inside as Record<string, unknown>)[step] : undefined,
    value,
  );
  const pointer = path.map((step) => `/${step}`).join('');
  return { pointer, field, message: sentence(issue, wordsFor(field), unitOf(field), found) };
}

function wordsFor(field: string): string {
  const suffix = UNITS.find(([ending]) => field.endsWith(ending))?.[0] ?? '';
  return WORDS[field] ?? field.slice(0, field.length - suffix.length).replaceAll('_', ' ');
}

function unitOf(field: string): string {
  const unit = UNITS.find(([ending]) => field.endsWith(ending))?.[1];
  return unit === undefined ? '' : ` ${unit}`;
}

function sentence(issue: z.core.$ZodIssue, words: string, unit: string, found: unknown): string {
  const the = words === '' ? 'This' : `The ${words}`;
  if (issue.code === 'too_big' && issue.origin === 'string') {
    return `${the} can have at most ${Number(issue.maximum)} characters; this one has ${String(found).length.toLocaleString('en-GB')}.`;
  }
  if (issue.code === 'too_small' && issue.origin === 'string') return `${the} must not be empty.`;
  if (issue.code === 'too_big' && issue.origin === 'array') {
    return `${the} can hold at most ${Number(issue.maximum)}; there are ${(found as unknown[]).length}.`;
  }
  if (issue.code === 'too_small' && issue.origin === 'array')
    return `${the} must be at least ${Number(issue.minimum)}.`;
  if (issue.code === 'too_big')
    return `${the} must be at most ${Number(issue.maximum)}${unit}; it is ${String(found)}${unit}.`;
  if (issue.code === 'too_small') {
    const bound = issue.inclusive === false ? 'more than' : 'at least';
    return `${the} must be ${bound} ${Number(issue.minimum)}${unit}; it is ${String(found)}${unit}.`;
  }
  if (issue.code === 'unrecognized_keys') return `There is no field named ${issue.keys.join(', ')} here.`;
  if (issue.code === 'invalid_value') return `${the} must be one of ${issue.values.map(String).join(', ')}.`;
  if (issue.code === 'invalid_type' && issue.expected === 'number') return `${the} must be a number, like 12.5.`;
  return `${the} is not in a form the survey can hold.`;
}
