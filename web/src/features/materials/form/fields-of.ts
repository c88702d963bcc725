import { countName, type FieldSection, type FieldSpec, type Values } from './field-spec.ts';

/** A field in its place: `runs/0/mass_kg`. */
export interface PlacedField {
  readonly name: string;
  readonly spec: FieldSpec;
  /** Stands before the label where lines repeat: "Run 2". */
  readonly line: string | null;
}

/** How many lines of a list there are. */
export function lineCount(values: Values, rows: NonNullable<FieldSection['rows']>): number {
  const count = Number(values[countName(rows.path)] ?? rows.start);
  return Number.isInteger(count) && count >= 0 && count <= rows.most ? count : rows.start;
}

/** Every field that is asked for now, in order. */
export function fieldsOf(sections: readonly FieldSection[], values: Values): readonly PlacedField[] {
  return sections.flatMap((section): readonly PlacedField[] => {
    if (section.when?.(values) === false) return [];
    const { rows } = section;
    if (rows === undefined) {
      return section.fields
        .filter((spec) => spec.when?.(values) !== false)
        .map((spec) => ({ name: spec.path, spec, line: null }));
    }
    return Array.from({ length: lineCount(values, rows) }, (_, index) =>
      section.fields.map((spec) => ({
        name: `${rows.path}/${index}/${spec.path}`,
        spec,
        line: `${rows.noun} ${index + 1}`,
      })),
    ).flat();
  });
}

/** What stands in a field now: what was typed, or what is chosen at first. */
export function valueOf(values: Values, name: string, spec: FieldSpec): string {
  return values[name] ?? (spec.as === 'choice' ? spec.start : '');
}
