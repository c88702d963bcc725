import type { MaterialWay } from '@embertally/shared/materials/material-draft';
import type { FieldSection } from '../field-spec.ts';
import { BOMB_FIELDS } from './bomb-fields.ts';
import { MORE_FIELDS, NAME_FIELDS } from './common-fields.ts';
import { COMPOSITION_FIELDS } from './composition-fields.ts';
import { EQUATION_FIELDS } from './equation-fields.ts';
import { FORMULA_FIELDS } from './formula-fields.ts';
import { SUPPLIER_FIELDS } from './supplier-fields.ts';
import { ULTIMATE_FIELDS } from './ultimate-fields.ts';

const BY_WAY: Readonly<Record<MaterialWay, readonly FieldSection[]>> = {
  formula: FORMULA_FIELDS,
  equation: EQUATION_FIELDS,
  bomb: BOMB_FIELDS,
  ultimate: ULTIMATE_FIELDS,
  supplier: SUPPLIER_FIELDS,
  composition: COMPOSITION_FIELDS,
};

/** Everything that is asked for one way, in the order it is asked. */
export function sectionsOf(way: MaterialWay): readonly FieldSection[] {
  return [NAME_FIELDS, ...BY_WAY[way], MORE_FIELDS];
}
