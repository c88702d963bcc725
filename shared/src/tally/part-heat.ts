import type { Material } from '../catalogue/catalogue-row.ts';
import { materialByKey } from '../catalogue/materials.ts';
import { netAsReceived } from '../methods/heat/net-as-received.ts';
import { netFromGross } from '../methods/heat/net-from-gross.ts';
import { HEAT_OF_VAPORISATION_MJ_KG } from '../methods/heat/water.ts';
import type { RoomInputEntry, RoomInputPart } from './room-input.ts';

/** Net heat of a part with what the sums and the uncertainty need to know about it. */
export interface PartHeat {
  /** Parts of one key share one heat value and are one group in `byMaterial`. */
  readonly key: string;
  readonly label: string;
  readonly material: Material | undefined;
  /** Mass of one piece, kg. */
  readonly mass: number;
  /** Net, as received, MJ/kg. */
  readonly heat: number;
  readonly low: number;
  readonly high: number;
  readonly ownHeat: boolean;
  readonly combustionFactor: number;
  readonly cellulosic: boolean;
  /** Yields with enough air, kg per kg burnt; null where not known. */
  readonly soot: number | null;
  readonly carbonMonoxide: number | null;
  /** Moisture was stated, so its own spread counts. */
  readonly moist: boolean;
  readonly heatDry: number;
}

/** Half-width of the triangle for a stated heat without a range: a mixed product has a standard deviation of 15 %. */
const OWN_HEAT_SPREAD = 0.15 * Math.sqrt(6);

/** The heat of one part: the person's own when given, else the catalogue's; brought to net, as received. */
export function partHeat(entry: RoomInputEntry, part: RoomInputPart): PartHeat {
  const material = part.material == null ? undefined : materialByKey(part.material);
  const own = part.net_heat_MJ_kg ?? null;
  const basis = own === null ? (material?.net_heat_MJ_kg ?? 0) : own;
  const water = (part.moisture_pct ?? 0) / 100;
  const { dry, received } = netHeats(part, material, basis, water);
  const shift = received / (basis || 1);
  const stated = own === null ? material : undefined;
  const low = part.low_MJ_kg != null ? part.low_MJ_kg * shift : (stated?.low_MJ_kg ?? received * (1 - OWN_HEAT_SPREAD));
  const high =
    part.high_MJ_kg != null ? part.high_MJ_kg * shift : (stated?.high_MJ_kg ?? received * (1 + OWN_HEAT_SPREAD));
  const cellulosic = part.cellulosic ?? material?.cellulosic ?? true;
  const effective = part.heat_basis === 'effective' || entry.curve != null;
  return {
    key: part.material ?? `own:${part.label ?? ''}:${basis}`,
    label: part.label ?? material?.label ?? part.material ?? 'Own heat',
    material,
    mass: part.mass_kg,
    heat: received,
    low: Math.min(low, received),
    high: Math.max(high, received),
    ownHeat: own !== null,
    combustionFactor: effective ? 1 : cellulosic ? 0.8 : 1,
    cellulosic,
    soot: part.soot_yield ?? material?.soot_yield ?? null,
    carbonMonoxide: part.co_yield ?? material?.co_yield ?? null,
    moist: part.moisture_pct != null,
    heatDry: dry,
  };
}

/** A heat with a stated moisture is dry unless said to be as received; a gross one is first made net. */
function netHeats(part: RoomInputPart, material: Material | undefined, basis: number, w: number) {
  const received = part.water === 'as_received' || (part.water == null && part.moisture_pct == null);
  const hydrogen = part.hydrogen_mass_fraction ?? 0;
  if (part.net_heat_MJ_kg == null) return materialHeats(material, basis, part.moisture_pct == null ? null : w);
  if (received) {
    const net =
      part.basis === 'gross'
        ? netFromGross.run({ H_gross: basis, w_H: hydrogen * (1 - w) }) - HEAT_OF_VAPORISATION_MJ_KG * w
        : basis;
    return { dry: (net + HEAT_OF_VAPORISATION_MJ_KG * w) / (1 - w), received: Math.max(0, net) };
  }
  const dry = part.basis === 'gross' ? netFromGross.run({ H_gross: basis, w_H: hydrogen }) : basis;
  return { dry, received: Math.max(0, netAsReceived.run({ H_dry: dry, w })) };
}

/** A catalogue heat includes the catalogue's moisture; a stated moisture replaces it. */
function materialHeats(material: Material | undefined, heat: number, w: number | null) {
  if (w === null) return { dry: heat, received: heat };
  const u = (material?.moisture_pct_dry ?? 0) / 100;
  const usual = u / (1 + u);
  const dry = (heat + HEAT_OF_VAPORISATION_MJ_KG * usual) / (1 - usual);
  return { dry, received: Math.max(0, netAsReceived.run({ H_dry: dry, w })) };
}
