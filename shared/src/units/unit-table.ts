export interface Unit {
  /** As the tally and the contracts write it, plain ASCII: `MJ/m2`. */
  readonly key: string;
  /** As a person reads it: `MJ/m²`. */
  readonly symbol: string;
  /** Units convert only within one dimension. */
  readonly dimension: string;
  /** What one of it is in the dimension's first unit. Temperature: after the zero point is taken off. */
  readonly factor: number;
  /** Its reading at 0 °C; 0 for every unit that is not a temperature. */
  readonly zero: number;
  /** What a person may type for it besides key and symbol; lower case. */
  readonly aliases: readonly string[];
}

// Exact by definition: NIST SP 811, appendix B. The Btu is the International Table one.
const FOOT_M = 0.3048;
const INCH_M = 0.0254;
const POUND_KG = 0.45359237;
const BTU_MJ = 1055.05585262e-6;
const BTU_KJ = 1055.05585262e-3;
const GALLON_M3 = 231 * INCH_M ** 3;

type Row = readonly [key: string, symbol: string, factor: number, aliases?: readonly string[], zero?: number];

function dimension(name: string, rows: readonly Row[]): readonly Unit[] {
  return rows.map(([key, symbol, factor, aliases = [], zero = 0]) => ({
    key,
    symbol,
    dimension: name,
    factor,
    zero,
    aliases,
  }));
}

/** Every unit that is shown or may be typed. The first of each dimension is the one the factors refer to. */
export const UNIT_TABLE: readonly Unit[] = [
  ...dimension('length', [
    ['m', 'm', 1, ['metre', 'metres', 'meter', 'meters']],
    ['cm', 'cm', 0.01, ['centimetre', 'centimetres']],
    ['mm', 'mm', 0.001, ['millimetre', 'millimetres']],
    ['ft', 'ft', FOOT_M, ["'", '′', '’', 'foot', 'feet']],
    ['in', 'in', INCH_M, ['"', '″', '”', "''", 'inch', 'inches']],
    ['yd', 'yd', 3 * FOOT_M, ['yard', 'yards']],
  ]),
  ...dimension('area', [
    ['m2', 'm²', 1, ['sq m', 'sqm', 'square metres', 'square meters']],
    ['ft2', 'ft²', FOOT_M ** 2, ['sq ft', 'sqft', 'square feet']],
  ]),
  ...dimension('volume', [
    ['m3', 'm³', 1, ['cu m', 'cubic metres', 'cubic meters']],
    ['L', 'L', 0.001, ['litre', 'litres', 'liter', 'liters']],
    ['ft3', 'ft³', FOOT_M ** 3, ['cu ft', 'cubic feet']],
    ['gal', 'US gal', GALLON_M3, ['gallon', 'gallons']],
  ]),
  ...dimension('mass', [
    ['kg', 'kg', 1, ['kilo', 'kilos', 'kilogram', 'kilograms']],
    ['g', 'g', 0.001, ['gram', 'grams']],
    ['t', 't', 1000, ['tonne', 'tonnes']],
    ['lb', 'lb', POUND_KG, ['lbs', 'pound', 'pounds']],
    ['oz', 'oz', POUND_KG / 16, ['ounce', 'ounces']],
  ]),
  ...dimension('time', [
    ['s', 's', 1, ['sec', 'second', 'seconds']],
    ['min', 'min', 60, ['mins', 'minute', 'minutes']],
    ['h', 'h', 3600, ['hr', 'hrs', 'hour', 'hours']],
  ]),
  ...dimension('temperature', [
    ['°C', '°C', 1, ['c', 'celsius', 'deg c']],
    ['°F', '°F', 5 / 9, ['f', 'fahrenheit', 'deg f'], 32],
  ]),
  ...dimension('temperature difference', [
    ['K', 'K', 1, ['kelvin']],
    ['°F difference', '°F difference', 5 / 9],
  ]),
  ...dimension('energy', [
    ['MJ', 'MJ', 1],
    ['kJ', 'kJ', 0.001],
    ['GJ', 'GJ', 1000],
    ['kWh', 'kWh', 3.6],
    ['Btu', 'Btu', BTU_MJ],
    ['million Btu', 'million Btu', BTU_MJ * 1e6, ['mmbtu']],
  ]),
  ...dimension('heat release rate', [
    ['kW', 'kW', 1],
    ['W', 'W', 0.001],
    ['MW', 'MW', 1000],
    ['Btu/s', 'Btu/s', BTU_KJ],
  ]),
  ...dimension('growth coefficient', [
    ['kW/s2', 'kW/s²', 1],
    ['Btu/s3', 'Btu/s³', BTU_KJ],
  ]),
  ...dimension('heat per area', [
    ['MJ/m2', 'MJ/m²', 1],
    ['Btu/ft2', 'Btu/ft²', BTU_MJ / FOOT_M ** 2],
  ]),
  ...dimension('heat per mass', [
    ['MJ/kg', 'MJ/kg', 1, ['kj/g']],
    ['Btu/lb', 'Btu/lb', BTU_MJ / POUND_KG],
  ]),
  ...dimension('heat per length', [
    ['MJ/m', 'MJ/m', 1],
    ['Btu/ft', 'Btu/ft', BTU_MJ / FOOT_M],
  ]),
  ...dimension('heat per volume', [
    ['MJ/m3', 'MJ/m³', 1],
    ['Btu/ft3', 'Btu/ft³', BTU_MJ / FOOT_M ** 3],
  ]),
  ...dimension('heat flux', [
    ['kW/m2', 'kW/m²', 1],
    ['Btu/s ft2', 'Btu/(s·ft²)', BTU_KJ / FOOT_M ** 2, ['btu/(s ft2)', 'btu/s/ft2']],
  ]),
  ...dimension('heat transfer coefficient', [
    ['kW/m2K', 'kW/m²K', 1],
    ['Btu/s ft2 °F', 'Btu/(s·ft²·°F)', (BTU_KJ / FOOT_M ** 2) * 1.8],
  ]),
  ...dimension('density', [
    ['kg/m3', 'kg/m³', 1],
    ['lb/ft3', 'lb/ft³', POUND_KG / FOOT_M ** 3],
  ]),
  ...dimension('mass per area', [
    ['kg/m2', 'kg/m²', 1],
    ['lb/ft2', 'lb/ft²', POUND_KG / FOOT_M ** 2],
  ]),
  ...dimension('mass per length', [
    ['kg/m', 'kg/m', 1],
    ['lb/ft', 'lb/ft', POUND_KG / FOOT_M],
  ]),
  ...dimension('opening factor', [
    ['m^½', 'm^½', 1, ['m1/2']],
    ['ft^½', 'ft^½', Math.sqrt(FOOT_M)],
  ]),
  ...dimension('ventilation factor', [
    ['m^5/2', 'm^5/2', 1, ['m5/2']],
    ['ft^5/2', 'ft^5/2', FOOT_M ** 2.5],
  ]),
  ...dimension('response time index', [
    ['(m s)1/2', '(m·s)^½', 1, ['(m·s)^½', '(m·s)½']],
    ['(ft s)1/2', '(ft·s)^½', Math.sqrt(FOOT_M), ['(ft·s)^½', '(ft·s)½']],
  ]),
  ...dimension('thermal conductivity', [
    ['W/mK', 'W/mK', 1, ['w/(m·k)', 'w/(m k)']],
    ['Btu/h ft °F', 'Btu/(h·ft·°F)', ((BTU_KJ * 1000) / 3600 / FOOT_M) * 1.8],
  ]),
  ...dimension('specific heat', [
    ['J/kgK', 'J/kgK', 1, ['j/(kg·k)', 'j/(kg k)']],
    ['kJ/kgK', 'kJ/kgK', 1000, ['kj/(kg·k)']],
    ['Btu/lb °F', 'Btu/(lb·°F)', ((BTU_KJ * 1000) / POUND_KG) * 1.8],
  ]),
];
