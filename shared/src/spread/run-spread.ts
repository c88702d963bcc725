import { ExposedEntries, type ExposureRules, type Lighting } from './exposed-entries.ts';
import { areaUnder, ownCurve } from './own-curve.ts';
import { PieceClock } from './piece-clock.ts';
import { RoomClock, type ClockStop } from './room-clock.ts';
import type { SpreadScene } from './spread-scene.ts';

/** What the openings can feed, kW per m^5/2 of A√H. */
export const OPENINGS_KW = 1500;
/** No fire is followed longer, s. */
export const LONGEST_S = 4 * 3600;
/** A growth phase is drawn in at least this many pieces, which makes its area at most 0.03 % too large. */
const GROWTH_PIECES = 40;
/** A fire cut short while it grew has but few of these pieces: it is followed again in finer ones until its area is right. */
const MOST_AREA_ERROR = 0.00035;
const FINER = 8;
const FINEST = 64;
const KJ_PER_MJ = 1000;
/** With nothing left to light only the curve is followed, which is exact for any step, s. */
const IDLE_STEP_S = 20;
/** Share of the burning time below which a step would be lost in rounding: openings of a hair’s breadth ask for such. */
const LEAST_STEP = 1e-12;

export type SpreadCause = 'first' | 'radiation' | 'layer' | 'flame' | 'flashover' | 'starved';

export interface SpreadEvent {
  /** The entry that lights; null for `starved`, which is the room's. */
  readonly id: string | null;
  /** s since first ignition */
  readonly t: number;
  readonly cause: SpreadCause;
  /** Flux at ignition, kW/m²; null where none lit it (first, flashover, starved). */
  readonly flux_kW_m2: number | null;
  /** The burning entry that radiated most onto it. */
  readonly from: string | null;
  /** Nearer than 2.5 diameters of that entry, where the point source has not been tested. */
  readonly nearField: boolean;
}

/** What an entry that stayed unlit, or was lit, had received. */
export interface Exposure {
  readonly id: string;
  /** s; null: never lit. */
  readonly ignited_s: number | null;
  readonly cause: SpreadCause | null;
  /** Highest flux while unlit, kW/m². */
  readonly highestFlux_kW_m2: number;
  /** Dose taken in while unlit and the dose that lights it, (kW/m²)ⁿ·s; seconds held in the simple variant. */
  readonly dose: number;
  readonly neededDose: number;
}

export interface SpreadRun {
  readonly first: string;
  readonly events: readonly SpreadEvent[];
  readonly exposures: readonly Exposure[];
  /** Room curve `[s, kW]`, straight lines between, as computed: about one point per second. */
  readonly points: readonly (readonly [number, number])[];
  readonly released_MJ: number;
  /** Heat of entries that can burn and did not, MJ. */
  readonly unburnt_MJ: number;
  readonly peak_kW: number;
  /** s at which the last entry burns out, the air ends or four hours are over. */
  readonly end_s: number;
  /** `overtaken`: followed no further, see `runSpread`. */
  readonly stopped: 'burnt-out' | 'starved' | 'four-hours' | 'overtaken';
  readonly flashover_s: number | null;
  /** s at which half of the heat of the room is released; null: never. */
  readonly halfHeat_s: number | null;
  /** Time during which the openings held the fire back, s. */
  readonly atCap_s: number;
  readonly layerIncluded: boolean;
}

export interface RunRules extends ExposureRules {
  /** kW/s², the least growth of what flashover lights. */
  readonly flashoverGrowth_kW_s2: number;
  /** s */
  readonly step_s: number;
}

/**
 * One fire from one first entry. Deterministic: the same scene and first entry give the same run.
 * @param flashoverBy_s a fire without flashover by then is followed no further: for who looks for an earlier one
 */
export function runSpread(scene: SpreadScene, first: number, rules: RunRules, flashoverBy_s = Infinity): SpreadRun {
  let longestPiece_s = Infinity;
  for (let finer = 1; ; finer *= FINER) {
    const run = new Run(scene, first, rules, flashoverBy_s, longestPiece_s);
    const result = run.result();
    const cutShort = result.stopped === 'starved' || result.stopped === 'four-hours';
    if (!cutShort || finer > FINEST || run.isDrawnWell) return result;
    longestPiece_s = run.burning_s / GROWTH_PIECES / finer;
  }
}

class Run {
  private readonly room: RoomClock;
  private readonly pieces: PieceClock;
  private readonly exposed: ExposedEntries;
  private readonly events: SpreadEvent[] = [];
  private readonly lit: (SpreadEvent | undefined)[];
  private flashover_s: number | null = null;
  private longestPiece: number;

  constructor(
    private readonly scene: SpreadScene,
    private readonly first: number,
    private readonly rules: RunRules,
    private readonly flashoverBy_s: number,
    private readonly longestAllowed_s: number,
  ) {
    const { factorBefore, factorAfter, flashover_kW, oxygenLimitedHeat_MJ } = scene.room;
    const closed = factorBefore === 0 && factorAfter === 0;
    this.room = new RoomClock({
      cap_kW: capOf(factorBefore),
      flashover_kW: flashover_kW ?? Infinity,
      heat_kJ: closed && oxygenLimitedHeat_MJ !== null ? oxygenLimitedHeat_MJ * KJ_PER_MJ : Infinity,
      time_s: LONGEST_S,
    });
    this.longestPiece = longestAllowed_s;
    this.pieces = new PieceClock(scene.entries.length);
    this.exposed = new ExposedEntries(scene, rules);
    this.lit = new Array<SpreadEvent | undefined>(scene.entries.length).fill(undefined);
  }

  result(): SpreadRun {
    const stopped = this.scene.canBurn(this.first) ? this.burn() : 'burnt-out';
    const { room, scene } = this;
    const total = scene.heat_MJ;
    // What rounding leaves over is no heat left unburnt.
    const spent = room.heat / KJ_PER_MJ;
    const released = spent > total * (1 - ROUNDING) ? total : spent;
    return {
      first: scene.entries[this.first]!.id,
      events: this.events,
      exposures: scene.entries.map(({ id }, index) => ({
        id,
        ignited_s: this.lit[index]?.t ?? null,
        cause: this.lit[index]?.cause ?? null,
        highestFlux_kW_m2: this.exposed.highestFlux[index]!,
        dose: Math.min(this.exposed.dose[index]!, this.exposed.neededDose[index]!),
        neededDose: this.exposed.neededDose[index]!,
      })),
      points: room.points,
      released_MJ: released,
      unburnt_MJ: total - released,
      peak_kW: room.peak,
      end_s: room.t,
      stopped,
      flashover_s: this.flashover_s,
      halfHeat_s: timeOfHeat(room, (total * KJ_PER_MJ) / 2),
      atCap_s: room.atCap_s,
      layerIncluded: scene.layer !== undefined,
    };
  }

  /** Burning time so far, s. */
  get burning_s(): number {
    return this.room.T;
  }

  /** Whether the drawn curve has the area of the heat released. */
  get isDrawnWell(): boolean {
    const { points, heat } = this.room;
    return Math.abs(areaUnder(points) - heat) <= MOST_AREA_ERROR * heat;
  }

  private burn(): SpreadRun['stopped'] {
    this.light(this.first, { cause: 'first' });
    for (;;) {
      if (this.flashover_s === null && this.room.t > this.flashoverBy_s) return 'overtaken';
      const stop = this.step();
      if (stop === 'flashover') this.flash();
      else if (stop === 'starved') {
        this.events.push({ id: null, t: this.room.t, cause: 'starved', ...NO_FLUX });
        return 'starved';
      } else if (stop === 'time') return 'four-hours';
      else if (this.pieces.burning === 0) return 'burnt-out';
    }
  }

  private step(): ClockStop | undefined {
    const { room, exposed } = this;
    const { t, T } = room;
    const waits = exposed.any && this.flashover_s === null;
    const step_s = waits ? this.rules.step_s : IDLE_STEP_S;
    const dT = Math.max(T * LEAST_STEP, step_s * Math.min(1, room.cap / room.demand));
    const lighting = waits ? exposed.step({ t, T, dT, cap: room.cap }) : NOTHING_LIGHTS;
    for (const one of lighting) {
      const stop = this.runTo(T + one.share * dT);
      if (stop !== undefined) return stop;
      this.light(one.index, one);
    }
    return this.runTo(T + dT, lighting.length === 0);
  }

  /** Runs the room's clock through every change of a curve up to T; may end at the last change when nothing burns on. */
  private runTo(T: number, mayEnd = false): ClockStop | undefined {
    const { room, pieces } = this;
    while (pieces.next <= T) {
      const stop = this.runSmoothly(pieces.next);
      if (stop !== undefined) return stop;
      pieces.take();
      room.follow(pieces.total);
      this.longestPiece = Math.min(this.longestAllowed_s, pieces.shortestCurved / GROWTH_PIECES);
      if (mayEnd && pieces.burning === 0) return undefined;
    }
    return this.runSmoothly(T);
  }

  private runSmoothly(T: number): ClockStop | undefined {
    const { room, longestPiece } = this;
    const from = room.T;
    const parts = Math.ceil((T - from) / longestPiece);
    for (let part = 1; part < parts; part += 1) {
      const stop = room.runTo(from + ((T - from) * part) / parts);
      if (stop !== undefined) return stop;
    }
    return room.runTo(T);
  }

  private light(index: number, by: Pick<SpreadEvent, 'cause'> | Lighting, curve = this.scene.curve(index)): void {
    const { room, scene } = this;
    const { entries } = scene;
    const event: SpreadEvent = {
      id: entries[index]!.id,
      t: room.t,
      cause: by.cause,
      ...('flux' in by
        ? {
            flux_kW_m2: by.flux,
            from: by.from === undefined ? null : entries[by.from]!.id,
            nearField: by.nearField,
          }
        : NO_FLUX),
    };
    this.events.push(event);
    this.lit[index] = event;
    this.pieces.begin(index, curve, room.T);
    if (this.flashover_s === null) this.exposed.light(index, curve, room.T);
  }

  /** Everything that can burn and does not yet lights now, at least ultra-fast, and the openings are what they become. */
  private flash(): void {
    const { scene, room, rules } = this;
    this.flashover_s = room.t;
    room.flashed(capOf(scene.room.factorAfter));
    for (const [index, entry] of scene.entries.entries()) {
      if (this.lit[index] !== undefined || !scene.canBurn(index)) continue;
      this.light(index, { cause: 'flashover' }, ownCurve(entry, rules.flashoverGrowth_kW_s2));
    }
  }
}

const NO_FLUX = { flux_kW_m2: null, from: null, nearField: false } as const;
const NOTHING_LIGHTS: readonly Lighting[] = [];

/** No opening at all: nothing holds the rate back, the air in the room ends the fire instead. */
function capOf(factor: number): number {
  return factor > 0 ? OPENINGS_KW * factor : Infinity;
}

/** Sums of heat that differ by no more than this share are the same. */
const ROUNDING = 1e-9;

function timeOfHeat({ heats, points, heat }: RoomClock, half: number): number | null {
  const wanted = half * (1 - ROUNDING);
  if (!(wanted > 0) || heat < wanted) return null;
  const at = heats.findIndex((value) => value >= wanted);
  const [before, after] = [heats[at - 1] ?? 0, heats[at]!];
  const [from, to] = [points[at - 1]?.[0] ?? 0, points[at]![0]];
  return after > before ? from + ((to - from) * (wanted - before)) / (after - before) : to;
}
