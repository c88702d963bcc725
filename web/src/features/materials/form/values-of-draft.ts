import type { MaterialDraft } from '@embertally/shared/materials/material-draft';
import { convert } from '@embertally/shared/units/convert';
import { displayUnit } from '@embertally/shared/units/display-unit';
import type { UnitSystem } from '@embertally/shared/units/unit-system';
import { countName, findName, type FieldSpec, type Values } from './field-spec.ts';
import { fieldsOf } from './fields-of.ts';
import { getAt } from './put-at.ts';
import { sectionsOf } from './ways/sections-of.ts';

/**
 * A draft as it would have been typed, to begin the next version from.
 *
 * @param nameOf what a material of the catalogue is called
 */
export function valuesOfDraft(draft: MaterialDraft, system: UnitSystem, nameOf: (key: string) => string): Values {
  const sections = sectionsOf(draft.way);
  const values: Record<string, string> = { way: draft.way };
  for (const { rows } of sections) {
    const lines = rows === undefined ? undefined : getAt(draft, rows.path);
    if (rows !== undefined && Array.isArray(lines)) values[countName(rows.path)] = String(lines.length);
  }
  // Choices first: they say which of the other fields are asked for at all.
  const fill = (only: (spec: FieldSpec) => boolean): void => {
    for (const { name, spec } of fieldsOf(sections, values)) {
      const value = getAt(draft, name);
      if (value === undefined || value === null || !only(spec)) continue;
      values[name] = textOf(value, spec, system);
      if (spec.as !== 'material' || typeof value !== 'string') continue;
      values[findName(name)] = nameOf(value);
      if (spec.version === undefined) continue;
      const version = name.replace(/[^/]+$/, spec.version);
      const pinned = getAt(draft, version);
      values[version] = typeof pinned === 'number' ? String(pinned) : '';
    }
  };
  fill((spec) => spec.as === 'choice');
  fill((spec) => spec.as !== 'choice');
  return values;
}

function textOf(value: unknown, spec: FieldSpec, system: UnitSystem): string {
  if (spec.as === 'number' && typeof value === 'number') {
    const inUnit = value / (spec.factor ?? 1);
    const shown = spec.own === true ? displayUnit(spec.unit, system) : undefined;
    return String(Number((shown === undefined ? inUnit : convert(inUnit, spec.unit, shown.key)).toPrecision(12)));
  }
  if (spec.as === 'yes-no') return value === true ? 'yes' : 'no';
  if (Array.isArray(value)) return value.join(spec.as === 'words' ? ', ' : ' ');
  return typeof value === 'string' ? value : '';
}
