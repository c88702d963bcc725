import { FirstTables1764547200000 } from './first-tables.ts';
import { OwnMaterialWorkings1764676800000 } from './own-material-workings.ts';
import { OwnMaterials1764633600000 } from './own-materials.ts';
import { SurveySecondShape1764590400000 } from './survey-second-shape.ts';

/** Oldest first. A released migration is never edited; a change is a new one. */
export const ALL_MIGRATIONS = [
  FirstTables1764547200000,
  SurveySecondShape1764590400000,
  OwnMaterials1764633600000,
  OwnMaterialWorkings1764676800000,
];
