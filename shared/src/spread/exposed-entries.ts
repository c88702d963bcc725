import { flameLength, rateForFlame } from '../methods/plume/flame-length.ts';
import { HELD_S } from './ignition-class.ts';
import { rateAt, type OwnCurve } from './own-curve.ts';
import { PieceClock } from './piece-clock.ts';
import { MOST_FLUX_KW_M2, NEAR_FIELD_DIAMETERS } from './radiation.ts';
import type { SpecialPair, SpreadScene } from './spread-scene.ts';

/** An entry that lights inside a step. */
export interface Lighting {
  readonly index: number;
  /** Share of the step that had passed, 0 to 1. */
  readonly share: number;
  readonly cause: 'radiation' | 'layer' | 'flame';
  /** In the middle of the step, kW/m². */
  readonly flux: number;
  /** The burning entry that gave most; undefined when none radiates onto it. */
  readonly from: number | undefined;
  readonly nearField: boolean;
}

export interface ExposureRules {
  /** k_f: 1 for events, 2 for gaps. */
  readonly fluxFactor: number;
  readonly ignition: 'dose' | 'held';
}

interface Step {
  readonly t: number;
  readonly T: number;
  readonly dT: number;
  readonly cap: number;
}

/**
 * Everything that could still light, with the flux each one gets. Fluxes are taken in the middle of a step from what burned
 * at its beginning, for all entries at once, so that their order cannot matter.
 */
export class ExposedEntries {
  /** Dose so far (or seconds held) and highest flux, by entry. */
  readonly dose: Float64Array;
  readonly highestFlux: Float64Array;
  /** Dose (or seconds) that lights each entry. */
  readonly neededDose: Float64Array;
  private readonly clock: PieceClock;
  private readonly waiting: Int32Array;
  private left = 0;
  private readonly lit: Uint8Array;
  /** Radiation on each entry, c0 + c1 T + c2 T², kW/m². */
  private readonly c0: Float64Array;
  private readonly c1: Float64Array;
  private readonly c2: Float64Array;
  private readonly beside: Float64Array;
  private readonly flameShare: Float64Array;
  private readonly critical: Float64Array;
  private readonly squared: Uint8Array;
  private special: SpecialPair[] = [];

  constructor(
    private readonly scene: SpreadScene,
    private readonly rules: ExposureRules,
  ) {
    const count = scene.entries.length;
    const perEntry = () => new Float64Array(count);
    [this.dose, this.highestFlux, this.beside, this.flameShare] = [perEntry(), perEntry(), perEntry(), perEntry()];
    [this.c0, this.c1, this.c2, this.critical, this.neededDose] = [
      perEntry(),
      perEntry(),
      perEntry(),
      perEntry(),
      perEntry(),
    ];
    this.squared = new Uint8Array(count);
    this.lit = new Uint8Array(count);
    this.waiting = new Int32Array(count);
    this.clock = new PieceClock(count);
    const held = rules.ignition === 'held';
    for (const [index, { ignition }] of scene.entries.entries()) {
      this.critical[index] = held ? ignition.held_kW_m2 : ignition.critical_kW_m2;
      this.neededDose[index] = held ? HELD_S : ignition.dose;
      this.squared[index] = ignition.exponent === 2 ? 1 : 0;
      if (scene.isExposed(index)) this.waiting[this.left++] = index;
    }
  }

  /** Whether anything is left that could light. */
  get any(): boolean {
    return this.left > 0;
  }

  /** An entry burns from burning time T on: it radiates, and it is no longer waiting. */
  light(index: number, curve: OwnCurve, T: number): void {
    this.lit[index] = 1;
    this.clock.begin(index, curve, T);
    let kept = 0;
    for (let k = 0; k < this.left; k += 1) {
      if (this.waiting[k] !== index) this.waiting[kept++] = this.waiting[k]!;
    }
    this.left = kept;
    this.special.push(...this.scene.view(index).special);
  }

  /** One step: adds to every dose and returns what lights, first things first. */
  step({ t, T, dT, cap }: Step): readonly Lighting[] {
    const { fluxFactor } = this.rules;
    const middle = T + dT / 2;
    while (this.clock.next <= middle) this.takeChange();
    const { c0, c1, c2 } = this.clock.total;
    const demand = Math.max(0, c0 + middle * (c1 + middle * c2));
    const share = Math.min(1, cap / demand);
    const dt = dT / share;
    const layer = this.scene.layer?.(share * demand, t + dt / 2) ?? 0;
    this.besideFluxes(T, dT, share);
    const lighting: Lighting[] = [];
    for (let k = 0; k < this.left; k += 1) {
      const j = this.waiting[k]!;
      const direct = share * (this.c0[j]! + middle * (this.c1[j]! + middle * this.c2[j]!)) + this.beside[j]!;
      const flux = fluxFactor * direct + layer;
      if (flux > this.highestFlux[j]!) this.highestFlux[j] = flux;
      const passed = Math.min(this.doseShare(j, flux, dt), this.flameShare[j]!);
      if (passed <= 1) lighting.push(this.lighting(j, passed, flux, layer, middle));
    }
    return lighting.sort((a, b) => a.share - b.share);
  }

  /** Adds a step's dose; the share of the step after which it suffices, above 1 when it does not. */
  private doseShare(j: number, flux: number, dt: number): number {
    const above = flux - this.critical[j]!;
    const before = this.dose[j]!;
    if (this.rules.ignition === 'held') {
      this.dose[j] = above >= 0 ? before + dt : 0;
      return above >= 0 ? (this.neededDose[j]! - before) / dt : Infinity;
    }
    if (!(above > 0)) return Infinity;
    const gained = (this.squared[j] === 1 ? above * above : above) * dt;
    this.dose[j] = before + gained;
    return (this.neededDose[j]! - before) / gained;
  }

  private takeChange(): void {
    const { index, c0, c1, c2 } = this.clock.take();
    const { weights } = this.scene.view(index);
    for (let k = 0; k < this.left; k += 1) {
      const j = this.waiting[k]!;
      const weight = weights[j]!;
      this.c0[j]! += weight * c0;
      this.c1[j]! += weight * c1;
      this.c2[j]! += weight * c2;
    }
  }

  /** Fluxes that are no plain multiple of a rate: near pairs at their upper limit, and flames below a target. */
  private besideFluxes(T: number, dT: number, share: number): void {
    for (let k = 0; k < this.left; k += 1) {
      this.beside[this.waiting[k]!] = 0;
      this.flameShare[this.waiting[k]!] = Infinity;
    }
    this.special = this.special.filter(({ source, target }) => this.lit[target] === 0 && this.clock.isBurning(source));
    for (const pair of this.special) {
      const { source, target, above_m } = pair;
      this.beside[target]! += this.specialFlux(pair, T + dT / 2, share);
      if (above_m === null) continue;
      const reaching = rateForFlame(above_m, this.scene.source(source)!.diameter);
      const before = share * this.ownRate(source, T);
      const after = share * this.ownRate(source, T + dT);
      if (before < reaching && after < reaching) continue;
      const passed = before >= reaching ? 0 : (reaching - before) / (after - before);
      this.flameShare[target] = Math.min(this.flameShare[target]!, passed);
    }
  }

  private ownRate(source: number, T: number): number {
    return rateAt(this.clock.curveOf(source)!, T - this.clock.begunAt(source));
  }

  private specialFlux({ source, view, above_m }: SpecialPair, T: number, share: number): number {
    const rate = share * this.ownRate(source, T);
    const power = this.scene.entries[source]!.radiativeFraction * rate;
    if (above_m === null) return Math.min(MOST_FLUX_KW_M2, power * view);
    const { halfShort, diameter } = this.scene.source(source)!;
    const R = Math.max(above_m - flameLength(rate, diameter) / 2, halfShort);
    return Math.min(MOST_FLUX_KW_M2, power / (4 * Math.PI * R * R));
  }

  private lighting(index: number, share: number, flux: number, layer: number, T: number): Lighting {
    const byFlame = this.flameShare[index]! <= share;
    const from = this.mostGivenBy(index, T);
    return {
      index,
      share: Math.max(0, share),
      cause: byFlame ? 'flame' : layer >= flux / 2 ? 'layer' : 'radiation',
      flux,
      from,
      nearField: from !== undefined && this.scene.diametersApart(from, index) < NEAR_FIELD_DIAMETERS,
    };
  }

  /** The burning entry that radiates most onto a target. */
  private mostGivenBy(target: number, T: number): number | undefined {
    let from: number | undefined;
    let most = 0;
    for (let i = 0; i < this.scene.entries.length; i += 1) {
      if (!this.clock.isBurning(i)) continue;
      const weight = this.scene.view(i).weights[target]!;
      if (weight * this.clock.curveOf(i)!.peak <= most) continue;
      const given = weight * this.ownRate(i, T);
      if (given > most) [from, most] = [i, given];
    }
    for (const pair of this.special) {
      if (pair.target !== target) continue;
      const given = this.specialFlux(pair, T, 1);
      if (given > most) [from, most] = [pair.source, given];
    }
    return from;
  }
}
