import type { Kind } from './catalogue-row.ts';
import { BUILDING } from './kinds/building.ts';
import { ELECTRICAL } from './kinds/electrical.ts';
import { FURNITURE } from './kinds/furniture.ts';
import { KITCHEN_AND_HOUSEHOLD } from './kinds/kitchen-and-household.ts';
import { LIQUIDS_AND_GASES } from './kinds/liquids-and-gases.ts';
import { PAPER_AND_RECORDS } from './kinds/paper-and-records.ts';
import { PLASTICS_AND_FOAMS } from './kinds/plastics-and-foams.ts';
import { STORAGE_AND_PALLETS } from './kinds/storage-and-pallets.ts';
import { TEXTILES_AND_COSTUME } from './kinds/textiles-and-costume.ts';
import { TIMBER_AND_SCENERY } from './kinds/timber-and-scenery.ts';
import { WASTE } from './kinds/waste.ts';

/** Every built-in kind, in the order the catalogue page shows them. */
export const KINDS: readonly Kind[] = [
  ...FURNITURE,
  ...TEXTILES_AND_COSTUME,
  ...PAPER_AND_RECORDS,
  ...STORAGE_AND_PALLETS,
  ...TIMBER_AND_SCENERY,
  ...PLASTICS_AND_FOAMS,
  ...LIQUIDS_AND_GASES,
  ...ELECTRICAL,
  ...KITCHEN_AND_HOUSEHOLD,
  ...WASTE,
  ...BUILDING,
];

const byKey = new Map(KINDS.map((kind) => [kind.key, kind]));

/** The kind with this key; undefined for a key the catalogue does not have. */
export function kindByKey(key: string): Kind | undefined {
  return byKey.get(key);
}
