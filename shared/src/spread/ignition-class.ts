/** How readily an entry lights under radiation. */
export type IgnitionClass = 'easy' | 'normal' | 'hard' | 'resistant';

/** What it takes to light an entry. */
export interface Ignition {
  /** Flux below which it never lights, however long, kW/m². */
  readonly critical_kW_m2: number;
  /** 1 for thin, 2 for thermally thick things. */
  readonly exponent: 1 | 2;
  /** ∫(q − q_cr)ⁿ dt at which it lights, (kW/m²)ⁿ·s. */
  readonly dose: number;
  /** Of the simple variant: flux at which it lights once the flux has been held, kW/m². */
  readonly held_kW_m2: number;
}

export interface IgnitionClassRow extends Ignition {
  readonly key: IgnitionClass;
  readonly what: string;
}

/**
 * The four classes. Thresholds are deliberately at the low end of Quintiere & Harkleroad 1984 (from memory: flexible foam 16,
 * plywood 16, particleboard 18, hardboard 10, carpets 18 to 23 kW/m²); the thin dose is an areal heat capacity of
 * 0.4 kg/m² · 1.3 kJ/kgK over 280 K; the thick doses give the usual cone times (wood 14 to 25 s at 50 kW/m²). Held fluxes:
 * Babrauskas 1981 (from memory) knows easy, normal and hard; resistant things are taken as hard there.
 */
export const IGNITION_CLASSES: Readonly<Record<IgnitionClass, IgnitionClassRow>> = {
  easy: {
    key: 'easy',
    what: 'curtains, loose or crumpled paper, thin film, hanging clothes',
    critical_kW_m2: 8,
    exponent: 1,
    dose: 150,
    held_kW_m2: 10,
  },
  normal: {
    key: 'normal',
    what: 'upholstery, mattresses, cartons, foam plastics, boxes of paper',
    critical_kW_m2: 10,
    exponent: 2,
    dose: 6000,
    held_kW_m2: 20,
  },
  hard: {
    key: 'hard',
    what: 'solid wood, boards, books in a row, solid plastics, cans of liquid',
    critical_kW_m2: 12.5,
    exponent: 2,
    dose: 20_000,
    held_kW_m2: 40,
  },
  resistant: {
    key: 'resistant',
    what: 'rigid PVC, phenolic, flame-retarded plastics, low-fire-hazard cable',
    critical_kW_m2: 20,
    exponent: 2,
    dose: 40_000,
    held_kW_m2: 40,
  },
};

/** Seconds for which the simple variant asks its flux to be held; common practice. */
export const HELD_S = 30;

/** The ignition of a class; a threshold of one's own, kW/m², replaces the critical flux only. */
export function ignitionOf(key: IgnitionClass, own_kW_m2: number | null = null): Ignition {
  const { critical_kW_m2, exponent, dose, held_kW_m2 } = IGNITION_CLASSES[key];
  return { critical_kW_m2: own_kW_m2 ?? critical_kW_m2, exponent, dose, held_kW_m2 };
}

/** Seconds until an entry lights under a constant flux, kW/m²; Infinity at or below its critical flux. */
export function timeToIgnite(ignition: Ignition, flux_kW_m2: number): number {
  const above = flux_kW_m2 - ignition.critical_kW_m2;
  return above > 0 ? ignition.dose / above ** ignition.exponent : Infinity;
}
