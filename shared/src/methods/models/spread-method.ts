import type { MethodOutput, MethodSummary } from '../define-method.ts';
import { en1991, recalled } from '../sources.ts';

/** What a method of many parts says of itself, with what it gives and what it leaves out. */
export interface SpreadMethod<Output extends string = string> extends MethodSummary {
  readonly outputs: Readonly<Record<Output, MethodOutput>>;
  readonly limits: readonly string[];
}

const SOURCES: MethodSummary['sources'] = [
  en1991('E.4: growth, plateau and decay of each entry; the curve is extended where the air does not suffice'),
  {
    title: 'Fleury, Evaluation of thermal radiation models for fire spread between objects, University of Canterbury',
    edition: '2010',
    locator: 'abstract: the point source did best on average and was most robust',
  },
  {
    title: 'Babrauskas, Will the second item ignite?, NBSIR 81-2271',
    edition: '1981',
    locator: 'abstract: flux of the first item against the ignitability of the second',
  },
  recalled('Smith & Green; Shields, Silcock & Murray', 'flux-time product, n = 1 thin, n = 2 thick', '1987, 1994'),
  recalled('Quintiere & Harkleroad, New concepts for measuring flame spread properties', 'critical fluxes', '1984'),
  recalled('Heskestad, Luminous heights of turbulent diffusion flames', 'L = 0.235 Q^0.4 − 1.02 D', '1983'),
  recalled('McCaffrey, Quintiere & Harkleroad', 'hot layer', '1981'),
  recalled('SFPE Handbook of Fire Protection Engineering', 'point source: above 5 kW/m2, safety factor 2'),
];

const INPUTS = {
  Q: { symbol: 'Q_i', unit: 'kW', quantity: 'Heat release rate of a burning entry', valid: [0, Infinity] },
  chi_r: { symbol: 'χ_r', unit: '', quantity: 'Share of it that radiates', valid: [0, 1] },
  G: { symbol: 'G_ij', unit: 'm-2', quantity: 'View of the target', valid: [0, Infinity] },
  k_f: { symbol: 'k_f', unit: '', quantity: 'Flux factor: 1 for events, 2 for enough of a gap', valid: [1, 2] },
  q_cr: { symbol: 'q_cr', unit: 'kW/m2', quantity: 'Critical flux of the target', valid: [0, 200] },
  dose: { symbol: 'dose', unit: '(kW/m2)^n s', quantity: 'Dose that lights the target', valid: [0, Infinity] },
} as const satisfies MethodSummary['inputs'];

type SpreadOutput = 'ignition' | 'flux' | 'flashover' | 'peak' | 'end' | 'released' | 'unburnt';
type GapOutput = 'asItStands' | 'justNot' | 'enough' | 'longExposure';

/** Which entry ignites which: what the model is made of, for screens, prints and workings. */
export const SPREAD_METHOD: SpreadMethod<SpreadOutput> = {
  id: 'spread.simulation',
  version: 1,
  ref: 'spread.simulation@1',
  title: 'Which entry ignites which',
  symbol: 't',
  unit: 's',
  inputs: INPUTS,
  outOfRange: 'warn',
  outputs: {
    ignition: { symbol: 't', unit: 's', quantity: 'Time of ignition since the first one' },
    flux: { symbol: 'q_j', unit: 'kW/m2', quantity: 'Flux at ignition' },
    flashover: { symbol: 't_fo', unit: 's', quantity: 'Time of flashover' },
    peak: { symbol: 'Q_max', unit: 'kW', quantity: 'Highest heat release rate of the room' },
    end: { symbol: 't_end', unit: 's', quantity: 'End of burning' },
    released: { symbol: 'E', unit: 'MJ', quantity: 'Heat released' },
    unburnt: { symbol: 'ΣE_i − E', unit: 'MJ', quantity: 'Heat left unburnt' },
  },
  equation:
    'q_j = k_f Σ min(120; χ_r Q_i G_ij) + q_L;  Σ (q_j − q_cr)ⁿ Δt ≥ dose;  G = (1/N) Σ 1/(4πR²);  q_L = σ[(T_0 + ΔT)⁴ − T_0⁴]',
  why: 'Among simple radiation models the point source came nearest to measured fluxes; cells keep long items right.',
  sources: SOURCES,
  assumptions: [
    'Each entry burns by its own curve: t-squared growth to its peak, linear decay from 70 % of its heat.',
    'A burning entry radiates a fixed share of its heat from 1 to 10 cells along its longer side; the target faces it at mid-flame height.',
    'An entry lights when the flux above its critical value, to the power 1 or 2, has summed up to its dose; a dose does not fade.',
    'What stands above a burning entry is heated from the middle of the flame and lights at once when the flame reaches it.',
    'The hot layer heats everything alike, seen in full; it counts while its linings are known and the room is not large.',
    'The openings feed 1500 kW per m5/2; above that every curve is stretched and no heat is lost.',
    'At flashover everything that is not sealed lights, at least ultra-fast, and glass that would break is broken.',
    'A closed cabinet lights at flashover only. A sealed and rated container never does.',
    'A measured curve keeps its rates and is stretched in time to hold the entry’s heat.',
    'Fluxes are taken in the middle of steps of one second, for four hours at most.',
  ],
  limits: [
    'One room; nothing passes to the next.',
    'No shading, no draught.',
    'No flame spread over an item, over floor or linings.',
    'Nothing falls, melts or runs.',
    'No smouldering, no suppression.',
    'Nearer than 2.5 diameters the point source leaves its tested range; such events are marked.',
    'Times are right to a factor of two at best.',
  ],
};

/** For gaps: what they mean and what they leave out, beside the limits above. */
export const GAP_METHOD: SpreadMethod<GapOutput> = {
  id: 'spread.gap',
  version: 1,
  ref: 'spread.gap@1',
  title: 'Gap that would keep one entry from lighting another',
  symbol: 'gap',
  unit: 'm',
  inputs: INPUTS,
  outOfRange: 'warn',
  outputs: {
    asItStands: { symbol: 'gap', unit: 'm', quantity: 'Clear distance as they stand' },
    justNot: { symbol: 'gap_1', unit: 'm', quantity: 'Gap that just does not light, k_f = 1' },
    enough: { symbol: 'gap_2', unit: 'm', quantity: 'Gap that is enough, k_f = 2' },
    longExposure: { symbol: 'gap_∞', unit: 'm', quantity: 'Gap that is enough however long it burns, k_f = 2' },
  },
  equation:
    'gap at which Σ (k_f min(120; χ_r Q G) + q_L − q_cr)ⁿ Δt = dose;  long exposure: k_f χ_r Q_p G + q_L = q_cr',
  why: 'A distance is asked for one pair; with three entries a larger gap can even light the third one sooner.',
  sources: SOURCES,
  assumptions: [
    'Only the first entry burns; the second is moved straight away from it along the line of centres.',
    'Enough: the same with twice the radiation. Long exposure: the peak held for ever, under the hottest layer of that fire.',
    'When a smaller gap also does not light it, the gap is 0.',
  ],
  limits: [
    'A gap on paper is no barrier: things fall, are moved and are put in between.',
    'No gap helps where the hot layer alone lights the entry or the first entry alone brings flashover.',
  ],
};
