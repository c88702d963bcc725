import { hotLayerMqh } from '../methods/room/hot-layer-mqh.ts';
import { liningHeatTransfer } from '../methods/room/lining-heat-transfer.ts';
import type { SpreadRoom } from './spread-room.ts';

/** Stefan–Boltzmann constant, kW/m²K⁴. */
const SIGMA = 5.670374419e-11;
const ZERO_C_IN_K = 273.15;
/** Emissivity × view of the layer; 1 gives 19.8 kW/m² for a layer of 500 °C, the usual criterion at the floor. */
const VIEW = 1;
const EARLIEST_S = 1;

/** Flux from the hot layer onto what stands below, kW/m², at a heat release rate, kW, and a time since ignition, s. */
export type HotLayer = (rate: number, t: number) => number;

/** The hot layer of the room; undefined where it is left out: no lining known, nothing open, or too large a room. */
export function hotLayer(room: SpreadRoom): HotLayer | undefined {
  const { surfaces, liningArea_m2: A_T, factorBefore: F, ambient_C, large } = room;
  if (surfaces === null || large || !(F > 0) || !(A_T > 0)) return undefined;
  const lined = surfaces
    .filter(({ area_m2 }) => area_m2 > 0)
    .map(({ area_m2, layers }) => ({
      area_m2,
      k: layers.map((layer) => layer.conductivity_W_mK),
      rho: layers.map((layer) => layer.density_kg_m3),
      c: layers.map((layer) => layer.specific_heat_J_kgK),
      d: layers.map((layer) => layer.thickness_m),
    }));
  const area = lined.reduce((sum, { area_m2 }) => sum + area_m2, 0);
  const T0 = ambient_C + ZERO_C_IN_K;
  return (rate, t) => {
    let flow = 0;
    for (const { area_m2, ...layers } of lined) {
      flow += area_m2 * liningHeatTransfer.run({ t: Math.max(EARLIEST_S, t), ...layers }).h_k;
    }
    const rise = hotLayerMqh.run({ Q: rate, h_k: flow / area, A_T, F, position: 'centre' });
    return VIEW * SIGMA * ((T0 + rise) ** 4 - T0 ** 4);
  };
}
