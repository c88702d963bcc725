import { hotLayer, type HotLayer } from './hot-layer.ts';
import { ownCurve, type OwnCurve } from './own-curve.ts';
import { placedRectangle, rectanglesOverlap, type PlacedRectangle } from './placed-rectangle.ts';
import { MOST_FLUX_KW_M2, nearestCell, radiatingFootprint, viewFactor, type RadiatingFootprint } from './radiation.ts';
import type { SpreadEntry } from './spread-entry.ts';
import type { SpreadRoom } from './spread-room.ts';

/** A target whose flux is no plain multiple of its source's rate: held down at 120 kW/m², or straight above it. */
export interface SpecialPair {
  readonly source: number;
  readonly target: number;
  /** 1/m², seen on the plan. */
  readonly view: number;
  /** Clear height from the source's base to the target's, m; null: beside it. */
  readonly above_m: number | null;
}

/** What one burning entry does to all others. */
export interface SourceView {
  /** χ_r · G of each target, 1/m²; 0 for special pairs, for itself and for what is not on the plan. */
  readonly weights: Float64Array;
  readonly special: readonly SpecialPair[];
}

/**
 * Entries and room made ready for any number of runs: sorted by id, so that the order of the input cannot matter, with
 * curves and views worked out once and only for what burns.
 */
export class SpreadScene {
  readonly entries: readonly SpreadEntry[];
  readonly layer: HotLayer | undefined;
  private readonly rectangles: readonly (PlacedRectangle | null)[];
  private readonly radiating: readonly (RadiatingFootprint | null)[];
  private readonly curves: (OwnCurve | undefined)[];
  private readonly views: (SourceView | undefined)[];

  constructor(
    entries: readonly SpreadEntry[],
    readonly room: SpreadRoom,
  ) {
    this.entries = [...entries].sort((a, b) => (a.id < b.id ? -1 : a.id > b.id ? 1 : 0));
    this.layer = hotLayer(room);
    this.rectangles = this.entries.map(({ place }) => place && placedRectangle(place));
    this.radiating = this.rectangles.map((rectangle) => rectangle && radiatingFootprint(rectangle));
    this.curves = new Array<OwnCurve | undefined>(this.entries.length).fill(undefined);
    this.views = new Array<SourceView | undefined>(this.entries.length).fill(undefined);
  }

  /** Whether an entry can burn at all: it is not sealed, and it has heat to give. */
  canBurn(index: number): boolean {
    const { enclosure, heat_MJ, peak_kW } = this.entries[index]!;
    return enclosure !== 'sealed' && heat_MJ > 0 && peak_kW > 0;
  }

  /** Whether radiation, layer or flame can light it. */
  isExposed(index: number): boolean {
    return this.canBurn(index) && this.entries[index]!.enclosure === 'open';
  }

  /** Heat of everything that can burn, MJ. */
  get heat_MJ(): number {
    return this.entries.reduce((sum, { heat_MJ }, index) => (this.canBurn(index) ? sum + heat_MJ : sum), 0);
  }

  curve(index: number): OwnCurve {
    return (this.curves[index] ??= ownCurve(this.entries[index]!));
  }

  footprint(index: number): PlacedRectangle | null {
    return this.rectangles[index]!;
  }

  source(index: number): RadiatingFootprint | null {
    return this.radiating[index]!;
  }

  view(index: number): SourceView {
    return (this.views[index] ??= this.look(index));
  }

  /** G of a pair on the plan, 1/m²; 0 when either is not on it. */
  viewFactor(source: number, target: number): number {
    const from = this.radiating[source]!;
    const to = this.rectangles[target]!;
    return from && to ? viewFactor(from, to) : 0;
  }

  /** Distance of a pair in diameters of the source. */
  diametersApart(source: number, target: number): number {
    const from = this.radiating[source]!;
    const to = this.rectangles[target]!;
    return from && to ? nearestCell(from, to) / from.diameter : Infinity;
  }

  private look(index: number): SourceView {
    const weights = new Float64Array(this.entries.length);
    const special: SpecialPair[] = [];
    const { radiativeFraction, place } = this.entries[index]!;
    const from = this.rectangles[index]!;
    const most = MOST_FLUX_KW_M2 / this.curve(index).peak;
    for (let target = 0; target < weights.length; target += 1) {
      const to = this.rectangles[target]!;
      if (!from || !to || target === index || !this.isExposed(target)) continue;
      const view = this.viewFactor(index, target);
      const rise = this.entries[target]!.place!.base_m - place!.base_m;
      const above_m = rise >= place!.height_m && rectanglesOverlap(from, to) ? rise : null;
      if (above_m !== null || radiativeFraction * view > most) special.push({ source: index, target, view, above_m });
      else weights[target] = radiativeFraction * view;
    }
    return { weights, special };
  }
}
