export const CEILING_INPUTS = {
  H: { symbol: 'H', unit: 'm', quantity: 'Ceiling above the fuel’s surface', valid: [0.1, 15] },
  r: { symbol: 'r', unit: 'm', quantity: 'Distance from the fire’s axis', valid: [0, 60] },
  place: { symbol: '', quantity: 'The fire stands', choices: ['free', 'wall', 'corner'] },
} as const;

/** The fire as a curve of straight pieces. */
export const CURVE_INPUTS = {
  t: { symbol: 't_i', unit: 's', quantity: 'Time, rising', valid: [0, 1e6], list: true },
  Q: { symbol: 'Q_i', unit: 'kW', quantity: 'Heat release rate, total', valid: [0, 1e7], list: true },
} as const;
