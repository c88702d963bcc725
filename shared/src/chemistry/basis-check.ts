import { ELEMENTS, type Atoms } from './atoms.ts';
import { combustionProducts } from './combustion-products.ts';
import { VAPORISATION_KJ_MOL } from './formation-enthalpies.ts';
import { OXYGEN_G_MOL } from './molar-mass.ts';

export type BasisFinding =
  | 'plausible'
  | 'genuine-exception'
  | 'own-oxygen'
  | 'wrong-mole-basis'
  | 'gross-for-net'
  | 'implausible'
  | 'not-covered';

export interface BasisCheck {
  /** MJ per kg of oxygen; null where no oxygen demand is known. */
  readonly perOxygen: number | null;
  readonly finding: BasisFinding;
  /** What the claimed heat would have to be multiplied by; proposed, never applied. Null when nothing is proposed. */
  readonly factor: number | null;
  readonly text: string;
}

/** Heat per kg of oxygen of nearly all organic fuels, MJ/kg. */
const USUAL = 13.1;
const BAND = [11, 15] as const;
/** A claim this near to a genuine value is that value. */
const NEAR = 0.06;
const RATIO_NEAR = 0.12;
const RATIOS = [2, 3, 4, 1 / 2, 1 / 3, 1 / 4] as const;

/** Fuels whose heat per kg of oxygen is really outside the band. */
const EXCEPTIONS: readonly { readonly name: string; readonly atoms: Partial<Atoms>; readonly perOxygen: number }[] = [
  { name: 'acetylene', atoms: { C: 2, H: 2 }, perOxygen: 15.7 },
  { name: 'hydrogen', atoms: { H: 2 }, perOxygen: 15.1 },
  { name: 'carbon monoxide', atoms: { C: 1, O: 1 }, perOxygen: 17.7 },
  { name: 'formaldehyde', atoms: { C: 1, H: 2, O: 1 }, perOxygen: 16.5 },
  { name: 'hydrogen cyanide', atoms: { C: 1, H: 1, N: 1 }, perOxygen: 16.15 },
  { name: 'hydrogen sulfide', atoms: { H: 2, S: 1 }, perOxygen: 10.8 },
  { name: 'sulfur', atoms: { S: 1 }, perOxygen: 9.3 },
];

const near = (value: number, target: number, share: number): boolean => Math.abs(value / target - 1) <= share;

/**
 * Compares a claimed net heat, kJ per mole of fuel, with the heat per kg of oxygen that fuels have, and says what mistake
 * would explain a difference. Nothing is changed: the correction is for a person to accept.
 */
export function checkBasis(atoms: Atoms, net_kJ_mol: number): BasisCheck {
  const combustion = combustionProducts(atoms);
  if (!combustion.ok) return { perOxygen: null, finding: 'not-covered', factor: null, text: combustion.message };
  const { O2, H2O } = combustion.products;
  const perOxygen = net_kJ_mol / (OXYGEN_G_MOL * O2);
  const exception = EXCEPTIONS.find(({ atoms: known }) =>
    ELEMENTS.every((element) => (known[element] ?? 0) === atoms[element]),
  );
  const judged = (finding: BasisFinding, factor: number | null, text: string): BasisCheck => ({
    perOxygen,
    finding,
    factor,
    text,
  });
  if (!(net_kJ_mol > 0))
    return judged('implausible', null, 'A fuel releases heat: give the heat as a positive number.');
  if (exception && near(perOxygen, exception.perOxygen, NEAR))
    return judged('genuine-exception', null, `For ${exception.name} this unusual heat per kg of oxygen is genuine.`);
  if (!exception && perOxygen >= BAND[0] && perOxygen <= BAND[1])
    return judged('plausible', null, 'Heat per kg of oxygen as fuels have it.');
  if (!exception && perOxygen > BAND[1] && net_kJ_mol / (OXYGEN_G_MOL * (O2 + nitroOxygen(atoms))) <= BAND[1])
    return judged(
      'own-oxygen',
      null,
      'It may carry oxygen of its own in nitro or nitrate groups; heat per kg of oxygen cannot judge it.',
    );
  const expected = exception?.perOxygen ?? USUAL;
  const asGross = (net_kJ_mol - VAPORISATION_KJ_MOL * H2O) / (OXYGEN_G_MOL * O2);
  if (perOxygen > expected && H2O > 0 && (exception ? near(asGross, expected, NEAR / 2) : inBandFromAbove(asGross)))
    return judged(
      'gross-for-net',
      asGross / perOxygen,
      'This looks like the gross heat: take off the heat in the water.',
    );
  const ratio = expected / perOxygen;
  const simple = RATIOS.find((one) => near(ratio, one, RATIO_NEAR));
  if (simple !== undefined)
    return judged(
      'wrong-mole-basis',
      simple,
      simple > 1
        ? `The heat seems to be divided ${simple} times too often: per one mole it would be ${simple} times this.`
        : `The heat seems to belong to ${Math.round(1 / simple)} moles: divide it by ${Math.round(1 / simple)}.`,
    );
  if (exception && perOxygen >= BAND[0] && perOxygen <= BAND[1])
    return judged(
      'implausible',
      null,
      `${exception.name} has about ${exception.perOxygen} MJ per kg of oxygen; check whether the value is for another fuel.`,
    );
  return judged('implausible', null, 'No simple mistake explains it: check formula, phase, and net against gross.');
}

/** Oxygen, mol, that nitro and nitrate groups would bring along if all nitrogen sat in them: three atoms each at most. */
function nitroOxygen(atoms: Atoms): number {
  return atoms.O >= 2 * atoms.N ? Math.min(atoms.O, 3 * atoms.N) / 2 : 0;
}

/** Just above the band as given, inside it without the water's heat. */
function inBandFromAbove(asGross: number): boolean {
  return asGross >= BAND[0] && asGross <= BAND[1];
}
