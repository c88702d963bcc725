import { findUnit } from '@embertally/shared/units/find-unit';
import { parseQuantity } from '@embertally/shared/units/parse-quantity';
import { readNumber } from '@embertally/shared/units/read-number';
import type { UnitSystem } from '@embertally/shared/units/unit-system';
import type { FieldSpec, NumberSpec } from './field-spec.ts';

export type ReadField = { readonly value: unknown } | { readonly error: string };

/**
 * What was typed into a field, as the draft keeps it, or what to put right.
 *
 * @param name what the field is called in the message: `Run 2: mass`
 * @param text not blank
 */
export function readField(spec: FieldSpec, name: string, text: string, system: UnitSystem): ReadField {
  switch (spec.as) {
    case 'number':
      return readQuantityField(spec, name, text, system);
    case 'yes-no':
      return { value: text === 'yes' };
    case 'words':
      return readWords(text, spec.most, name);
    case 'marks':
      return { value: text.split(' ') };
    case 'text':
      return text.length > spec.most
        ? { error: `${name} must be ${spec.most} characters or fewer; it has ${text.length}` }
        : { value: text };
    case 'choice':
    case 'material':
      return { value: text };
  }
}

function readWords(text: string, most: number, name: string): ReadField {
  const words = text
    .split(',')
    .map((word) => word.trim())
    .filter((word) => word !== '');
  if (words.length > 20) return { error: `${name}: 20 at most` };
  const long = words.find((word) => word.length > most);
  return long === undefined ? { value: words } : { error: `${name}: “${long}” is longer than ${most} characters` };
}

function readQuantityField(spec: NumberSpec, name: string, text: string, system: UnitSystem): ReadField {
  const { unit, minimum, maximum, factor = 1 } = spec;
  if (findUnit(unit) !== undefined) {
    const read = parseQuantity(text, {
      unit,
      // A laboratory writes grams and kelvins, whatever the person reads in.
      system: spec.own === true ? system : 'SI',
      name,
      ...(minimum === undefined ? {} : { minimum }),
      ...(maximum === undefined ? {} : { maximum }),
    });
    return read.ok ? { value: read.value * factor } : { error: read.message };
  }
  // "72 %" as well as "72": the unit stands in the field's end and may be typed.
  const read = readNumber(unit !== '' && text.trim().endsWith(unit) ? text.trim().slice(0, -unit.length) : text);
  const inUnit = unit === '' ? '' : ` ${unit}`;
  if (read.kind === 'not a number') return { error: `${name} must be a number${unit === '' ? '' : ` in ${unit}`}` };
  if (read.kind === 'ambiguous')
    return { error: `${name}: write ${read.grouped} or ${read.decimal}, whichever is meant` };
  if (minimum !== undefined && read.value < minimum) return { error: `${name} must be ${minimum}${inUnit} or more` };
  if (maximum !== undefined && read.value > maximum) return { error: `${name} must be ${maximum}${inUnit} or less` };
  return { value: read.value * factor };
}
