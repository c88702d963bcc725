import type { Atoms } from '@embertally/shared/chemistry/atoms';
import { atoms } from '../atoms.ts';
import type { ReferenceRow } from '../reference-row.ts';

const MORAN_SHAPIRO = 'Moran & Shapiro, Fundamentals of Engineering Thermodynamics, Table A-25';

/** Name, atoms, enthalpy of formation in the same table, kJ/mol; higher and lower heating value, MJ/kg (null: not read). */
const HEATING_VALUES: readonly (readonly [string, Atoms, number, number, number | null])[] = [
  ['carbon', atoms({ C: 1 }), 0, 32.77, 32.77],
  ['hydrogen', atoms({ H: 2 }), 0, 141.78, 119.95],
  ['methane', atoms({ C: 1, H: 4 }), -74.85, 55.51, 50.02],
  ['acetylene', atoms({ C: 2, H: 2 }), 226.73, 49.91, 48.22],
  ['ethylene', atoms({ C: 2, H: 4 }), 52.28, 50.3, 47.16],
  ['ethane', atoms({ C: 2, H: 6 }), -84.68, 51.87, 47.48],
  ['propylene', atoms({ C: 3, H: 6 }), 20.41, 48.92, 45.78],
  ['propane', atoms({ C: 3, H: 8 }), -103.85, 50.35, 46.36],
  ['butane', atoms({ C: 4, H: 10 }), -126.15, 49.5, 45.72],
  ['pentane, gas', atoms({ C: 5, H: 12 }), -146.44, 49.01, 45.35],
  ['octane, gas', atoms({ C: 8, H: 18 }), -208.45, 48.26, 44.79],
  ['octane, liquid', atoms({ C: 8, H: 18 }), -249.91, 47.9, 44.43],
  ['benzene, gas', atoms({ C: 6, H: 6 }), 82.93, 42.27, 40.58],
  ['methanol, gas', atoms({ C: 1, H: 4, O: 1 }), -200.89, 23.85, 21.11],
  ['methanol, liquid', atoms({ C: 1, H: 4, O: 1 }), -238.81, 22.67, 19.92],
  ['ethanol, gas', atoms({ C: 2, H: 6, O: 1 }), -235.31, 30.59, 27.72],
  ['ethanol, liquid', atoms({ C: 2, H: 6, O: 1 }), -277.69, 29.67, null],
];

/** Name, atoms, kilograms of air per kilogram of fuel. */
const AIR_RATIOS = [
  ['hydrogen', atoms({ H: 2 }), 34.3],
  ['methane', atoms({ C: 1, H: 4 }), 17.23],
  ['propane', atoms({ C: 3, H: 8 }), 15.67],
  ['isooctane', atoms({ C: 8, H: 18 }), 15.13],
  ['benzene', atoms({ C: 6, H: 6 }), 13.27],
  ['toluene', atoms({ C: 7, H: 8 }), 13.5],
  ['methanol', atoms({ C: 1, H: 4, O: 1 }), 6.47],
  ['ethanol', atoms({ C: 2, H: 6, O: 1 }), 9],
] as const;

/** Name, atoms, enthalpy of formation kJ/mol, MJ per kilogram of oxygen. */
const OXYGEN_HEATS = [
  ['methane', atoms({ C: 1, H: 4 }), -74.85, 12.54],
  ['ethane', atoms({ C: 2, H: 6 }), -84.68, 12.75],
  ['butane', atoms({ C: 4, H: 10 }), -126.15, 12.78],
  ['ethylene', atoms({ C: 2, H: 4 }), 52.28, 13.78],
  ['acetylene', atoms({ C: 2, H: 2 }), 226.73, 15.69],
] as const;

/** Dry wood: mass fractions of C, H, O, N, ash; gross heat measured, MJ/kg. */
const WOODS = [
  ['Douglas fir', 0.523, 0.063, 0.405, 0.001, 0.008, 21.05],
  ['redwood', 0.535, 0.059, 0.403, 0.001, 0.002, 21.03],
  ['ponderosa pine', 0.492, 0.059, 0.443, 0.0006, 0.003, 20.02],
] as const;

/** Heats, oxygen and air of pure fuels and of wood as textbooks and handbooks print them. */
export const HANDBOOK_CHEMISTRY_ROWS: readonly ReferenceRow[] = [
  ...HEATING_VALUES.map(([name, formula, dH_f, gross, net]): ReferenceRow => ({
    id: `heating-value-${name}`,
    method: 'chemistry.heat-from-formation',
    inputs: { ...formula, dH_f },
    expected: net === null ? { gross } : { gross, net },
    tolerance: { rel: 0.001 },
    origin: 'published',
    source: MORAN_SHAPIRO,
  })),
  ...AIR_RATIOS.map(([name, formula, air]): ReferenceRow => ({
    id: `air-ratio-${name}`,
    method: 'chemistry.complete-combustion',
    inputs: { ...formula },
    expected: { air },
    tolerance: { rel: 0.003 },
    origin: 'published',
    source: 'Heywood, Internal Combustion Engine Fundamentals, appendix D, stoichiometric air/fuel ratio',
    fromMemory: true,
  })),
  ...OXYGEN_HEATS.map(([name, formula, dH_f, perOxygen]): ReferenceRow => ({
    id: `oxygen-heat-${name}`,
    method: 'chemistry.heat-from-formation',
    inputs: { ...formula, dH_f },
    expected: { perOxygen },
    tolerance: { rel: 0.002 },
    origin: 'published',
    source: 'Huggett 1980, Fire and Materials 4, table of heat per kilogram of oxygen',
    fromMemory: true,
  })),
  ...WOODS.map(([name, w_C, w_H, w_O, w_N, w_ash, value]): ReferenceRow => ({
    id: `wood-gross-${name}`,
    method: 'chemistry.channiwala-parikh',
    inputs: { w_C, w_H, w_O, w_N, w_S: 0, w_ash },
    expected: { value },
    tolerance: { rel: 0.03 },
    origin: 'published',
    source: 'Tillman, Wood as an Energy Resource (1978), measured gross heat; the relation is good to 3 %',
    fromMemory: true,
  })),
  ...WOODS.map(([name, w_C, w_H, w_O, w_N, , value]): ReferenceRow => ({
    id: `wood-gross-boie-${name}`,
    method: 'chemistry.boie',
    inputs: { w_C, w_H, w_O, w_N, w_S: 0 },
    expected: { value },
    tolerance: { rel: 0.04 },
    origin: 'published',
    source: 'Tillman, Wood as an Energy Resource (1978), measured gross heat; the relation is good to 4 % of wood',
    fromMemory: true,
  })),
  {
    id: 'molar-mass-sucrose',
    method: 'chemistry.molar-mass',
    inputs: { ...atoms({ C: 12, H: 22, O: 11 }) },
    expected: { value: 342.3 },
    tolerance: { abs: 0.01 },
    origin: 'published',
    source: 'CRC Handbook of Chemistry and Physics, physical constants of organic compounds',
    fromMemory: true,
  },
  {
    id: 'molar-mass-vinyl-chloride',
    method: 'chemistry.molar-mass',
    inputs: { ...atoms({ C: 2, H: 3, Cl: 1 }) },
    expected: { value: 62.5 },
    tolerance: { abs: 0.01 },
    origin: 'published',
    source: 'CRC Handbook of Chemistry and Physics, physical constants of organic compounds',
    fromMemory: true,
  },
  {
    id: 'efficiency-polyethylene',
    method: 'chemistry.combustion-efficiency',
    inputs: { dH_T: 43.6, dH_ch: 38.4, dH_rad: 16.6 },
    expected: { chi: 0.88, radiative: 0.43 },
    tolerance: { abs: 0.006 },
    origin: 'published',
    source: 'Tewarson, SFPE Handbook, table of heats of combustion with χ and χ_rad/χ',
    fromMemory: true,
  },
  {
    id: 'efficiency-pvc',
    method: 'chemistry.combustion-efficiency',
    inputs: { dH_T: 16.4, dH_ch: 5.7, dH_rad: 2.6 },
    expected: { chi: 0.35, radiative: 0.46 },
    tolerance: { abs: 0.006 },
    origin: 'published',
    source: 'Tewarson, SFPE Handbook, table of heats of combustion with χ and χ_rad/χ',
    fromMemory: true,
  },
  {
    id: 'bomb-standardisation',
    method: 'calorimetry.bomb-calibration',
    // 6318 cal/g, 11.9 cal for nitric acid and 18.4 cal for the fuse, 4.184 J per calorie; 2426 cal/K are printed.
    inputs: { m: 0.0011651, H: 26.434512, b: 0.0001267752, dT: 3.047 },
    expected: { value: 0.010150384 },
    tolerance: { rel: 0.0003 },
    origin: 'published',
    source: 'operating instructions of a plain-jacket oxygen-bomb calorimeter, example of a standardisation',
    fromMemory: true,
  },
  {
    id: 'net-of-jet-fuel',
    method: 'heat.net-from-gross',
    // 46.20 - 0.2122 x 13.7 = 43.29: the standard starts from constant volume, hence 0.2 % above ours.
    inputs: { H_gross: 46.2, w_H: 0.137 },
    expected: { value: 43.293 },
    tolerance: { rel: 0.0025 },
    origin: 'published',
    source: 'ASTM D240, net heat = gross heat − 0.2122 × per cent of hydrogen',
    fromMemory: true,
  },
  ...(
    [
      [0.2, 14.31],
      [0.3, 12.22],
      [0.5, 8.03],
    ] as const
  ).map(([w, value]): ReferenceRow => ({
    id: `wood-chips-${w * 100}`,
    method: 'heat.net-as-received',
    inputs: { H_dry: 18.5, w },
    expected: { value },
    tolerance: { abs: 0.01 },
    origin: 'published',
    source: 'AIEL, Wood Fuels Handbook (2008), net calorific value against water content, dry 18.5 MJ/kg',
    fromMemory: true,
  })),
];
