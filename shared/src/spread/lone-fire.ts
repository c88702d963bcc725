import { HELD_S, type Ignition } from './ignition-class.ts';
import { MOST_FLUX_KW_M2 } from './radiation.ts';
import { LONGEST_S, OPENINGS_KW } from './run-spread.ts';
import type { SpreadScene } from './spread-scene.ts';

/** A fire of one entry alone, cut into pieces short enough for sums over its whole length. */
export interface LoneFire {
  readonly pieces: readonly LonePiece[];
  /** kW, as the openings let it. */
  readonly peak: number;
  /** Highest flux from the hot layer while it burns, kW/m². */
  readonly highestLayer: number;
  readonly radiativeFraction: number;
}

interface LonePiece {
  readonly dt: number;
  /** kW in its middle. */
  readonly rate: number;
  /** kW/m² */
  readonly layer: number;
}

const PIECES_PER_PHASE = 60;

/** What one entry does when nothing else burns. */
export function loneFire(scene: SpreadScene, index: number): LoneFire {
  const curve = scene.curve(index);
  const factor = scene.room.factorBefore;
  const cap = factor > 0 ? OPENINGS_KW * factor : Infinity;
  const perPhase = Math.ceil((3 * PIECES_PER_PHASE) / Math.max(3, curve.pieces.length));
  const pieces: LonePiece[] = [];
  let t = 0;
  let highestLayer = 0;
  for (const [phase, [c0, c1, c2]] of curve.pieces.entries()) {
    const from = curve.starts[phase]!;
    const dT = (curve.starts[phase + 1]! - from) / perPhase;
    for (let k = 0; k < perPhase && t < LONGEST_S; k += 1) {
      const T = from + (k + 0.5) * dT;
      const wanted = c0 + T * (c1 + T * c2);
      const dt = Math.min(dT * Math.max(1, wanted / cap), LONGEST_S - t);
      const rate = Math.min(wanted, cap);
      const layer = scene.layer?.(rate, t + dt / 2) ?? 0;
      highestLayer = Math.max(highestLayer, layer);
      pieces.push({ dt, rate, layer });
      t += dt;
    }
  }
  const { radiativeFraction } = scene.entries[index]!;
  return { pieces, peak: Math.min(curve.peak, cap), highestLayer, radiativeFraction };
}

/** Enough for a tenth of a millimetre at 10 m. */
const HALVINGS = 24;
/** Views are compared on a scale of distances from 1 cm to 1 km. */
const [WIDEST, NARROWEST] = [1 / (4 * Math.PI * 0.01 ** 2), 1 / (4 * Math.PI * 1000 ** 2)];

/**
 * The view, 1/m², at which the fire just lights an entry by its dose (or by a flux held).
 * @returns 0 when the hot layer alone lights it; Infinity when not even contact does
 */
export function criticalView(fire: LoneFire, ignition: Ignition, rule: 'dose' | 'held', fluxFactor: number): number {
  const lights = (view: number) =>
    rule === 'held' ? isHeld(fire, ignition, view, fluxFactor) : isDosed(fire, ignition, view, fluxFactor);
  if (lights(0)) return 0;
  if (!lights(WIDEST)) return Infinity;
  let [low, high] = [Math.log(NARROWEST), Math.log(WIDEST)];
  for (let i = 0; i < HALVINGS; i += 1) {
    const middle = (low + high) / 2;
    if (lights(Math.exp(middle))) high = middle;
    else low = middle;
  }
  return Math.exp(high);
}

/** The view at which the fire at its peak reaches the critical flux; 0 and Infinity as for `criticalView`. */
export function longExposureView(
  fire: LoneFire,
  ignition: Ignition,
  rule: 'dose' | 'held',
  fluxFactor: number,
): number {
  const critical = rule === 'held' ? ignition.held_kW_m2 : ignition.critical_kW_m2;
  const wanted = (critical - fire.highestLayer) / fluxFactor;
  if (wanted <= 0) return 0;
  return wanted >= MOST_FLUX_KW_M2 ? Infinity : wanted / (fire.radiativeFraction * fire.peak);
}

function fluxOf(fire: LoneFire, { rate, layer }: LonePiece, view: number, fluxFactor: number): number {
  return fluxFactor * Math.min(MOST_FLUX_KW_M2, fire.radiativeFraction * rate * view) + layer;
}

function isDosed(fire: LoneFire, ignition: Ignition, view: number, fluxFactor: number): boolean {
  let dose = 0;
  for (const piece of fire.pieces) {
    const above = fluxOf(fire, piece, view, fluxFactor) - ignition.critical_kW_m2;
    if (above > 0) dose += (ignition.exponent === 2 ? above * above : above) * piece.dt;
    if (dose >= ignition.dose) return true;
  }
  return false;
}

function isHeld(fire: LoneFire, ignition: Ignition, view: number, fluxFactor: number): boolean {
  let held = 0;
  for (const piece of fire.pieces) {
    held = fluxOf(fire, piece, view, fluxFactor) >= ignition.held_kW_m2 ? held + piece.dt : 0;
    if (held >= HELD_S) return true;
  }
  return false;
}
