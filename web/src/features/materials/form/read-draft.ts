import type { MaterialDraft, MaterialWay } from '@embertally/shared/materials/material-draft';
import { parseMaterialDraft } from '@embertally/shared/materials/parse-material-draft';
import type { UnitSystem } from '@embertally/shared/units/unit-system';
import type { Values } from './field-spec.ts';
import { fieldsOf, valueOf, type PlacedField } from './fields-of.ts';
import { readField } from './read-field.ts';
import { putAt } from './put-at.ts';
import { sectionsOf } from './ways/sections-of.ts';

export type ReadDraft =
  | { readonly ok: true; readonly draft: MaterialDraft }
  | { readonly ok: false; readonly errors: Readonly<Record<string, string>> };

/** A part of the draft that no field holds: a curve that was read, a proposal that was taken over. */
export type DraftExtras = Pick<MaterialDraft, 'curve' | 'accepted'>;

/** What a field is called in a message: `Run 2: mass`. */
export function fieldTitle({ spec, line }: PlacedField): string {
  return line === null ? spec.label : `${line}, ${spec.label.charAt(0).toLowerCase()}${spec.label.slice(1)}`;
}

/** Puts what was typed together to a draft, or says at each field what to put right. */
export function readDraft(way: MaterialWay, typed: Values, extras: DraftExtras, system: UnitSystem): ReadDraft {
  const values: Values = { ...typed, way };
  const fields = fieldsOf(sectionsOf(way), values);
  const errors: Record<string, string> = {};
  const draft: Record<string, unknown> = { way, ...extras };
  for (const field of fields) {
    const { name, spec } = field;
    const text = valueOf(values, name, spec).trim();
    const title = fieldTitle(field);
    if (text === '') {
      if (spec.optional !== true) errors[name] = missing(field);
      continue;
    }
    if (spec.as === 'choice' && spec.with !== undefined && (values[spec.with] ?? '').trim() === '') continue;
    const read = readField(spec, title, text, system);
    if ('error' in read) {
      errors[name] = read.error;
      continue;
    }
    putAt(draft, name, read.value);
    if (spec.as === 'material' && spec.version !== undefined) {
      const version = name.replace(/[^/]+$/, spec.version);
      putAt(draft, version, (values[version] ?? '') === '' ? null : Number(values[version]));
    }
  }
  if (Object.keys(errors).length > 0) return { ok: false, errors };
  const parsed = parseMaterialDraft(draft);
  if (parsed.ok) return parsed;
  return {
    ok: false,
    errors: Object.fromEntries(parsed.faults.map(({ pointer, message }) => [pointer.replace(/^\//, ''), message])),
  };
}

function missing({ spec, line }: PlacedField): string {
  const verb = spec.as === 'choice' || spec.as === 'material' ? 'Choose' : 'Enter';
  const asked = spec.label.charAt(0).toLowerCase() + spec.label.slice(1);
  const what = /^(where|how|what|who|when|the) /.test(asked) ? asked : `the ${asked}`;
  return line === null ? `${verb} ${what}` : `${line}: ${verb.toLowerCase()} ${what}`;
}
