import type { FieldSection, Values } from './field-spec.ts';
import { fieldsOf } from './fields-of.ts';

/**
 * The name of what a fault belongs to: the field at its place, the list around it, or the first field of the part it
 * names. Null where it belongs to the whole.
 *
 * @param pointer JSON pointer into the draft, `/runs/0/mass_kg`
 */
export function placeFault(pointer: string, sections: readonly FieldSection[], values: Values): string | null {
  const fields = fieldsOf(sections, values).map(({ name }) => name);
  const lists = sections.flatMap(({ rows, when }) =>
    rows === undefined || when?.(values) === false ? [] : [rows.path],
  );
  const known = new Set([...fields, ...lists]);
  const steps = pointer.replace(/^\/?(draft\/)?/, '').split('/');
  for (let length = steps.length; length > 0; length -= 1) {
    const place = steps.slice(0, length).join('/');
    if (known.has(place)) return place;
    const inside = fields.find((name) => name.startsWith(`${place}/`));
    if (inside !== undefined) return inside;
  }
  return null;
}
