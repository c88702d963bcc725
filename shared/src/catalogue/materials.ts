import type { Material } from './catalogue-row.ts';
import { CARBON } from './materials/carbon.ts';
import { CHEMICALS } from './materials/chemicals.ts';
import { FOAMS } from './materials/foams.ts';
import { FOOD } from './materials/food.ts';
import { GASES } from './materials/gases.ts';
import { HYDROCARBON_LIQUIDS } from './materials/hydrocarbon-liquids.ts';
import { LIQUIDS } from './materials/liquids.ts';
import { PAPER } from './materials/paper.ts';
import { PLASTICS } from './materials/plastics.ts';
import { PRODUCTS } from './materials/products.ts';
import { RUBBER } from './materials/rubber.ts';
import { SOLVENTS } from './materials/solvents.ts';
import { TEXTILES } from './materials/textiles.ts';
import { WOOD_AND_BOARD } from './materials/wood.ts';

/** Every built-in material, in the order the catalogue page shows them. */
export const MATERIALS: readonly Material[] = [
  ...WOOD_AND_BOARD,
  ...PAPER,
  ...TEXTILES,
  ...FOOD,
  ...CARBON,
  ...PLASTICS,
  ...FOAMS,
  ...RUBBER,
  ...LIQUIDS,
  ...SOLVENTS,
  ...HYDROCARBON_LIQUIDS,
  ...GASES,
  ...CHEMICALS,
  ...PRODUCTS,
];

const byKey = new Map(MATERIALS.map((material) => [material.key, material]));

/** The material with this key; undefined for a key the catalogue does not have. */
export function materialByKey(key: string): Material | undefined {
  return byKey.get(key);
}
