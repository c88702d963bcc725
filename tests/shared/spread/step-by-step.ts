import type { SpreadInput } from '@embertally/shared/spread/simulate-spread';
import type { SpreadEntry } from '@embertally/shared/spread/spread-entry';

/**
 * The same fire by plain steps of one second: every flux of every pair and every clock anew in each step. Shares
 * no line with the product; slow, and meant for comparison only. t-squared and step growth, dose ignition, everything on the plan.
 */
interface Burning {
  tau: number;
  alpha: number;
}

interface Stepped {
  readonly events: readonly { readonly id: string; readonly t: number; readonly cause: string }[];
  readonly flashover: number | null;
  readonly released_MJ: number;
}

const SIGMA = 5.670374419e-11;

export function stepByStep(input: SpreadInput): Stepped {
  const { entries, room } = input;
  const burning = new Map<SpreadEntry, Burning>();
  const pairs = new Map(entries.map((from) => [from, new Map(entries.map((to) => [to, pairOf(from, to)]))]));
  const dose = new Map(entries.map((entry) => [entry, 0]));
  const events: { id: string; t: number; cause: string }[] = [];
  const cap = (F: number) => (F > 0 ? 1500 * F : Infinity);
  let F = room.factorBefore;
  let flashover: number | null = null;
  let before = 0;
  let heat = 0;
  const light = (entry: SpreadEntry, t: number, cause: string, tau: number, least = 0) => {
    const alpha = entry.growth.by === 't-squared' ? Math.max(entry.growth.alpha_kW_s2, least) : 0;
    burning.set(entry, { tau, alpha });
    events.push({ id: entry.id, t, cause });
  };
  light(
    entries.find(({ id }) => id === input.first)!,
    0,
    'first',
    0,
  );
  for (let t = 0; t < 14_400; t += 1) {
    const demandAt = (later: number) =>
      [...burning].reduce((sum, [entry, { tau, alpha }]) => sum + ownRate(entry, alpha, tau + later), 0);
    const demand = demandAt(0);
    const s = Math.min(1, cap(F) / demand);
    const rate = Math.min(demand, cap(F));
    if (flashover === null && room.flashover_kW !== null && rate >= room.flashover_kW) {
      flashover = t - 1 + (room.flashover_kW - before) / (rate - before);
      F = room.factorAfter;
      for (const entry of entries) {
        if (burning.has(entry) || entry.enclosure === 'sealed') continue;
        light(entry, flashover, 'flashover', t - flashover, input.flashoverGrowth_kW_s2);
      }
    }
    before = rate;
    const later = s / 2;
    const q_L = layerFlux(input, Math.min(s * demandAt(later), cap(F)), t + 0.5);
    const lit: { entry: SpreadEntry; share: number; cause: string }[] = [];
    for (const target of entries) {
      if (burning.has(target) || target.enclosure !== 'open') continue;
      let direct = 0;
      let flame = false;
      for (const [source, { tau, alpha }] of burning) {
        const Q = s * ownRate(source, alpha, tau + later);
        const seen = fluxOfPair(pairs.get(source)!.get(target)!, source, Q);
        direct += Math.min(120, seen.flux);
        flame ||= seen.touched;
      }
      const flux = input.fluxFactor * direct + q_L;
      const { critical_kW_m2, exponent, dose: needed } = target.ignition;
      const had = dose.get(target)!;
      const gained = flux > critical_kW_m2 ? (flux - critical_kW_m2) ** exponent : 0;
      dose.set(target, had + gained);
      if (flame) lit.push({ entry: target, share: 0.5, cause: 'flame' });
      else if (had + gained >= needed) {
        lit.push({ entry: target, share: (needed - had) / gained, cause: q_L >= flux / 2 ? 'layer' : 'radiation' });
      }
    }
    for (const state of burning.values()) state.tau += s;
    heat += s * demandAt(-s / 2);
    for (const { entry, share, cause } of lit) light(entry, t + share, cause, s * (1 - share));
    if (demandAt(0) <= 0 && demandAt(0.5) <= 0) break;
  }
  return { events, flashover, released_MJ: heat / 1000 };
}

function ownRate({ heat_MJ, peak_kW, growth }: SpreadEntry, alpha: number, tau: number): number {
  const E = heat_MJ * 1000;
  if (tau < 0) return 0;
  if (growth.by === 'step') return tau < E / peak_kW ? peak_kW : 0;
  let peak = peak_kW;
  let grown = Math.sqrt(peak / alpha);
  let flat = (0.7 * E - (peak * grown) / 3) / peak;
  if (flat < 0) {
    grown = ((3 * 0.7 * E) / alpha) ** (1 / 3);
    peak = alpha * grown * grown;
    flat = 0;
  }
  const decay = (0.6 * E) / peak;
  if (tau < grown) return alpha * tau * tau;
  if (tau < grown + flat) return peak;
  return Math.max(0, peak * (1 - (tau - grown - flat) / decay));
}

interface Pair {
  /** 1/m² on the plan. */
  readonly view: number;
  /** m; null: not straight above the source. */
  readonly rise: number | null;
}

function pairOf(source: SpreadEntry, target: SpreadEntry): Pair {
  const a = source.place!;
  const rise = target.place!.base_m - a.base_m;
  const above = rise >= a.height_m && overlap(source, target);
  const long = Math.max(a.width_m, a.depth_m);
  const short = Math.min(a.width_m, a.depth_m);
  const N = Math.min(10, Math.max(1, Math.round(long / short)));
  const angle = ((a.rotation_deg + (a.width_m >= a.depth_m ? 0 : 90)) * Math.PI) / 180;
  let view = 0;
  for (let k = 0; k < N; k += 1) {
    const offset = -long / 2 + (long / N) * (k + 0.5);
    const distance = distanceTo(target, a.x_m + offset * Math.cos(angle), a.y_m + offset * Math.sin(angle));
    view += 1 / N / (4 * Math.PI * Math.max(short / 2, distance) ** 2);
  }
  return { view, rise: above ? rise : null };
}

function fluxOfPair({ view, rise }: Pair, source: SpreadEntry, Q: number): { flux: number; touched: boolean } {
  const power = source.radiativeFraction * Q;
  if (rise === null) return { flux: power * view, touched: false };
  const { width_m, depth_m } = source.place!;
  const L = Math.max(0, 0.235 * Q ** 0.4 - 1.02 * Math.sqrt((4 * width_m * depth_m) / Math.PI));
  const R = Math.max(rise - L / 2, Math.min(width_m, depth_m) / 2);
  return { flux: power / (4 * Math.PI * R * R), touched: L >= rise };
}

function distanceTo({ place }: SpreadEntry, x: number, y: number): number {
  const [u, v] = local(place!, x, y);
  return Math.hypot(Math.max(0, Math.abs(u) - place!.width_m / 2), Math.max(0, Math.abs(v) - place!.depth_m / 2));
}

function local(place: NonNullable<SpreadEntry['place']>, x: number, y: number): readonly [number, number] {
  const angle = (-place.rotation_deg * Math.PI) / 180;
  const [dx, dy] = [x - place.x_m, y - place.y_m];
  return [dx * Math.cos(angle) - dy * Math.sin(angle), dx * Math.sin(angle) + dy * Math.cos(angle)];
}

/** By points of a fine grid over one footprint; good enough for footprints that overlap clearly or not at all. */
function overlap(source: SpreadEntry, target: SpreadEntry): boolean {
  const a = source.place!;
  const angle = (a.rotation_deg * Math.PI) / 180;
  const GRID = 40;
  for (let i = 0; i <= GRID; i += 1) {
    for (let j = 0; j <= GRID; j += 1) {
      const [u, v] = [(i / GRID - 0.5) * a.width_m, (j / GRID - 0.5) * a.depth_m];
      const x = a.x_m + u * Math.cos(angle) - v * Math.sin(angle);
      const y = a.y_m + u * Math.sin(angle) + v * Math.cos(angle);
      if (distanceTo(target, x, y) === 0) return true;
    }
  }
  return false;
}

/** One layer of lining all round, which is what the rooms of the comparison have. */
function layerFlux({ room }: SpreadInput, Q: number, t: number): number {
  const layer = room.surfaces?.[0]?.layers[0];
  if (!layer || room.large || !(room.factorBefore > 0)) return 0;
  const { conductivity_W_mK: k, density_kg_m3: rho, specific_heat_J_kgK: c, thickness_m: d } = layer;
  const time = Math.max(1, t);
  const h = (time < ((rho * c) / k) * (d / 2) ** 2 ? Math.sqrt((k * rho * c) / time) : k / d) / 1000;
  const rise = Math.min(600, 6.85 * ((Q * Q) / (h * room.liningArea_m2 * room.factorBefore)) ** (1 / 3));
  const T0 = room.ambient_C + 273.15;
  return SIGMA * ((T0 + rise) ** 4 - T0 ** 4);
}
