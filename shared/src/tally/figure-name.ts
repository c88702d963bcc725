/** What each number of the tally is called on screen. A path that ends in a list position is named by its row. */
const NAMES: Readonly<Record<string, string>> = {
  'room.floorArea': 'Floor area',
  'room.enclosingArea': 'Area of all enclosing surfaces',
  'room.volume': 'Volume of the room',
  'room.openingFactor': 'Opening factor, open openings',
  'room.ventilationFactor': 'Ventilation factor, open openings',
  'room.ventilationLimit': 'Heat the open openings can feed',
  'room.openingFactorAfterGlass': 'Opening factor once the glass has gone',
  'room.ventilationFactorAfterGlass': 'Ventilation factor once the glass has gone',
  'room.ventilationLimitAfterGlass': 'Heat the openings can feed once the glass has gone',
  'room.flashover.thomas': 'Heat release for flashover, Thomas',
  'room.flashover.babrauskas': 'Heat release for flashover, Babrauskas',
  'room.flashover.mqh': 'Heat release for flashover, McCaffrey, Quintiere and Harkleroad',
  'room.flashover.time': 'Time to flashover',
  'room.hotLayer': 'Rise of the hot layer',
  'load.total': 'Heat kept in this room',
  'load.perFloor': 'Fire load density',
  'load.perEnclosure': 'Fire load per enclosing surface',
  'load.fixed': 'Heat in fixed entries',
  'load.stored': 'Heat in stored entries',
  'load.passing': 'Heat in passing entries',
  'load.combustionFactor': 'Combustion factor',
  'load.asKept': 'Fire load density as kept',
  'load.design': 'Design fire load density',
  'load.band.p5': 'Fire load density, 5 % point',
  'load.band.p50': 'Fire load density, middle',
  'load.band.p80': 'Fire load density, 80 % point',
  'load.band.p95': 'Fire load density, 95 % point',
  'load.standardUncertainty': 'Standard uncertainty of the density',
  'load.localPeak': 'Highest density over any 2 m × 2 m',
  'load.placeAmongUse': 'Place among rooms of this use',
  'growth.alpha': 'Growth coefficient',
  'growth.fuelPlateau': 'Plateau the fuel allows',
  'growth.openingsPlateau': 'Plateau the openings allow',
  'growth.plateau': 'Plateau that governs',
  'growth.growthEnd': 'End of growth',
  'growth.decayStart': 'Start of decay',
  'growth.end': 'End of the fire',
  'growth.peak': 'Peak heat release',
  'growth.heatReleased': 'Heat released',
  'burnout.thermalInertia': 'Thermal inertia of the linings',
  'burnout.openingFactor': 'Opening factor of the burn-out',
};

const CASES: Readonly<Record<string, string>> = { asKept: 'as kept', design: 'design load' };
const CASE_NAMES: Readonly<Record<string, string>> = {
  loadPerEnclosure: 'Load per enclosing surface',
  'parametric.peak': 'Peak burn-out temperature',
  'parametric.timeOfPeak': 'Time of the burn-out peak',
  equivalentTime: 'Equivalent time of exposure',
};

/**
 * The name of the number at a path.
 *
 * @param row what the row is called, for numbers in a list
 */
export function figureName(path: string, row?: string): string {
  const known = NAMES[path];
  if (known !== undefined) return known;
  const burnout = /^burnout\.(asKept|design)\.(.+)$/.exec(path);
  const quantity = burnout?.[2] === undefined ? undefined : CASE_NAMES[burnout[2]];
  if (quantity !== undefined) return `${quantity}, ${CASES[burnout?.[1] ?? ''] ?? ''}`;
  if (path.startsWith('load.byMaterial.') || path.startsWith('load.byEntry.')) return `Heat in ${row ?? 'this row'}`;
  if (path.startsWith('limits.')) return `Held to a limit: ${row ?? 'value'}`;
  return row ?? path;
}
