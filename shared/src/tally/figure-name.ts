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
  'burnout.beforeGlass.thermalInertia': 'Thermal inertia of the linings, before any glass breaks',
  'burnout.beforeGlass.openingFactor': 'Opening factor of the burn-out, before any glass breaks',
  'burnout.hydrocarbon.temperature': 'Gas temperature by the hydrocarbon curve',
  'response.sprinkler': 'Answer of the first sprinkler',
  'response.detector': 'Answer of the first detector',
  'response.heatDetector': 'Answer of the heat detector',
  'response.smokeDetector': 'Answer of the smoke detector',
  'air.oxygenLimitedHeat': 'Heat the air of the closed room can feed, to 13 % oxygen',
  'air.oxygenLimitedHeatAt15': 'Heat the air of the closed room can feed, to 15 % oxygen',
  'air.oxygenLimitedHeatAt10': 'Heat the air of the closed room can feed, to 10 % oxygen',
  'air.oxygenEnd': 'Air of the room used up after',
  'air.massForVisibility10m': 'Mass burnt until signs are seen 10 m away',
  'air.massForVisibility10mShining': 'Mass burnt until lit signs are seen 10 m away',
  'air.carbonMonoxide': 'Carbon monoxide at the oxygen limit, with enough air',
  'air.carbonMonoxideShortOfAir': 'Carbon monoxide at the oxygen limit, short of air',
  'spread.events': 'What sets what alight',
  'spread.gaps': 'Gaps between entries',
  'spread.curve': 'Heat release curve of the entries',
  'spread.flashover': 'Flashover by the order of ignition',
  'spread.peak': 'Peak heat release by the order of ignition',
  'spread.end': 'End of the fire by the order of ignition',
  'spread.heatReleased': 'Heat released by the order of ignition',
  'spread.unburnt': 'Heat left unburnt',
};

const SPREAD_NAMES: Readonly<Record<string, string>> = {
  t: 'Time of ignition',
  flux: 'Radiation at ignition',
  gap_m: 'Gap as it stands',
  just_not_m: 'Gap that just does not light',
  enough_m: 'Gap that is enough',
  long_exposure_m: 'Gap that is enough however long it burns',
};

const SAMPLED: Readonly<Record<string, string>> = {
  total: 'Heat kept in this room',
  perFloor: 'Fire load density',
  peak: 'Peak heat release',
  equivalentTime: 'Equivalent time of exposure, as kept',
};
const PLACES: Readonly<Record<string, string>> = {
  p5: '5 % point',
  p50: 'middle',
  p80: '80 % point',
  p95: '95 % point',
  mean: 'mean of the samples',
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
  const burnout = /^burnout\.(beforeGlass\.)?(asKept|design)\.(.+)$/.exec(path);
  const quantity = burnout?.[3] === undefined ? undefined : CASE_NAMES[burnout[3]];
  const stage = burnout?.[1] === undefined ? '' : ', before any glass breaks';
  if (quantity !== undefined) return `${quantity}, ${CASES[burnout?.[2] ?? ''] ?? ''}${stage}`;
  if (path.startsWith('load.byMaterial.') || path.startsWith('load.byEntry.')) return `Heat in ${row ?? 'this row'}`;
  const spread = /^spread\.(?:events|gaps)\.\d+\.(\w+)$/.exec(path)?.[1];
  const ofRow = spread === undefined ? undefined : SPREAD_NAMES[spread];
  if (ofRow !== undefined) return row === undefined ? ofRow : `${ofRow}: ${row}`;
  const band = /^uncertainty\.bands\.(\w+)\.(\w+)$/.exec(path);
  if (band !== null) return `${SAMPLED[band[1] ?? ''] ?? ''}, ${PLACES[band[2] ?? ''] ?? ''}`;
  if (path.startsWith('uncertainty.shares.')) return `Share of the variance: ${row ?? 'this input'}`;
  const advised = /^uncertainty\.advice\.\d+\.(\w+)$/.exec(path)?.[1];
  if (advised !== undefined) return `Fire load density if advice is followed, ${PLACES[advised] ?? ''}`;
  if (path.startsWith('limits.')) return `Held to a limit: ${row ?? 'value'}`;
  return row ?? path;
}
