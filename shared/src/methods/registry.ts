import { asKept } from './load/as-kept.ts';
import { characteristicLoad } from './load/characteristic-load.ts';
import { combustionFactor } from './load/combustion-factor.ts';
import { deltaN } from './load/delta-n.ts';
import { deltaQ1 } from './load/delta-q1.ts';
import { deltaQ2 } from './load/delta-q2.ts';
import { designLoad } from './load/design-load.ts';
import { enclosureFactor } from './load/enclosure-factor.ts';
import { fireLoad } from './load/fire-load.ts';
import { floorToEnclosure } from './load/floor-to-enclosure.ts';
import { localPeak } from './load/local-peak.ts';
import { perEnclosure } from './load/per-enclosure.ts';
import { perFloor } from './load/per-floor.ts';
import { protectedLoads } from './load/protected-loads.ts';
import { grossAsReceived } from './heat/gross-as-received.ts';
import { grossAshFree } from './heat/gross-ash-free.ts';
import { fromVolume } from './heat/from-volume.ts';
import { grossDry } from './heat/gross-dry.ts';
import { mixture } from './heat/mixture.ts';
import { netDry } from './heat/net-dry.ts';
import { statedHeat } from './heat/stated-heat.ts';
import { moistureEn } from './heat/moisture-en.ts';
import { moistureWetBasis } from './heat/moisture-wet-basis.ts';
import { netAsReceived } from './heat/net-as-received.ts';
import { netFromGross } from './heat/net-from-gross.ts';
import { gumbelFractile } from './statistics/gumbel-fractile.ts';
import { gumbelPlace } from './statistics/gumbel-place.ts';
import { lognormalFractile } from './statistics/lognormal-fractile.ts';
import { lognormalPlace } from './statistics/lognormal-place.ts';
import { bandFractile } from './uncertainty/band-fractile.ts';
import { fireLoadUncertainty } from './uncertainty/fire-load-uncertainty.ts';
import { perFloorUncertainty } from './uncertainty/per-floor-uncertainty.ts';
import { designFire } from './growth/design-fire.ts';
import { fuelPlateau, sumOfPeaks } from './growth/fuel-plateau.ts';
import { growthCoefficient } from './growth/growth-coefficient.ts';
import { heatReleased } from './growth/heat-released.ts';
import { openingsPlateau } from './growth/openings-plateau.ts';
import { plateau } from './growth/plateau.ts';
import { timeToReach } from './growth/time-to-reach.ts';
import { enclosureAreas } from './room/enclosure-areas.ts';
import { flashoverBabrauskas } from './room/flashover-babrauskas.ts';
import { flashoverMqh } from './room/flashover-mqh.ts';
import { flashoverThomas } from './room/flashover-thomas.ts';
import { hotLayerMqh } from './room/hot-layer-mqh.ts';
import { inverseOpeningFactor } from './room/inverse-opening-factor.ts';
import { kawagoe } from './room/kawagoe.ts';
import { liningHeatTransfer } from './room/lining-heat-transfer.ts';
import { meanHeatTransfer } from './room/mean-heat-transfer.ts';
import { openingFactor } from './room/opening-factor.ts';
import { openings } from './room/openings.ts';
import { roofVentEquivalent } from './room/roof-vent-equivalent.ts';
import { ventilationLimit } from './room/ventilation-limit.ts';
import { conversionFactor } from './burnout/conversion-factor.ts';
import { equivalentTimeJcss } from './burnout/equivalent-time-jcss.ts';
import { equivalentTimeLaw } from './burnout/equivalent-time-law.ts';
import { equivalentTimePettersson } from './burnout/equivalent-time-pettersson.ts';
import { equivalentTime } from './burnout/equivalent-time.ts';
import { unprotectedSteelFactor } from './burnout/material-factor.ts';
import { meanThermalInertia } from './burnout/mean-thermal-inertia.ts';
import { standardCurve, externalCurve, hydrocarbonCurve } from './burnout/nominal-curves.ts';
import { parametricCurve } from './burnout/parametric-curve.ts';
import { smallRoomWeight } from './burnout/small-room-weight.ts';
import { thermalInertia } from './burnout/thermal-inertia.ts';
import { ventilationWeight } from './burnout/ventilation-weight.ts';
import { basisCorrection } from './chemistry/basis-correction.ts';
import { basisDetector } from './chemistry/basis-detector.ts';
import { boie } from './chemistry/boie.ts';
import { channiwalaParikh } from './chemistry/channiwala-parikh.ts';
import { combustionEfficiency } from './chemistry/combustion-efficiency.ts';
import { completeCombustion } from './chemistry/complete-combustion.ts';
import { gasMoles } from './chemistry/gas-moles.ts';
import { heatFromEquation } from './chemistry/heat-from-equation.ts';
import { heatFromFormation } from './chemistry/heat-from-formation.ts';
import { netOfFormula } from './chemistry/net-of-formula.ts';
import { oxygenDemand } from './chemistry/oxygen-demand.ts';
import { substanceMass } from './chemistry/substance-mass.ts';
import { thornton } from './chemistry/thornton.ts';
import { airBuoyancy } from './calorimetry/air-buoyancy.ts';
import { bombAcceptance } from './calorimetry/bomb-acceptance.ts';
import { bombCalibration } from './calorimetry/bomb-calibration.ts';
import { bombRun } from './calorimetry/bomb-run.ts';
import { bombGross } from './calorimetry/bomb-gross.ts';
import { calibrationMean } from './calorimetry/calibration-mean.ts';
import { constantPressure, constantVolume } from './calorimetry/constant-pressure.ts';
import { curveHeat } from './calorimetry/curve-heat.ts';
import { effectiveHeat } from './calorimetry/effective-heat.ts';
import { netFromCondensate } from './calorimetry/net-from-condensate.ts';
import { orificeConstant } from './calorimetry/orifice-constant.ts';
import { oxygenCarbon } from './calorimetry/oxygen-carbon.ts';
import { oxygenConsumption } from './calorimetry/oxygen-consumption.ts';
import { waterEfficiency } from './calorimetry/water-efficiency.ts';
import { waterHeat } from './calorimetry/water-heat.ts';
import { closedRoom } from './temperature/closed-room.ts';
import { dealBeylerTransfer } from './temperature/deal-beyler-transfer.ts';
import { forcedDealBeyler } from './temperature/forced-deal-beyler.ts';
import { forcedFpa } from './temperature/forced-fpa.ts';
import { ceilingJet } from './plume/ceiling-jet.ts';
import { detectorResponse } from './plume/detector-response.ts';
import { detectorSteady } from './plume/detector-steady.ts';
import { farField } from './plume/far-field.ts';
import { flameHeight } from './plume/flame-height.ts';
import { localisedAtCeiling } from './plume/localised-at-ceiling.ts';
import { localisedBelowCeiling } from './plume/localised-below-ceiling.ts';
import { plumeMassFlow } from './plume/plume-mass-flow.ts';
import { plumeTemperature } from './plume/plume-temperature.ts';
import { plumeVelocity } from './plume/plume-velocity.ts';
import { rtiFromFeet } from './plume/rti-from-feet.ts';
import { smokeIndicator } from './plume/smoke-indicator.ts';
import { sprinklerLimited } from './plume/sprinkler-limited.ts';
import { travellingTime } from './plume/travelling-time.ts';
import { virtualOrigin } from './plume/virtual-origin.ts';
import { emissivePower } from './radiation/emissive-power.ts';
import { externalFlame } from './radiation/external-flame.ts';
import { openingRadiation, boundaryRadiation } from './radiation/opening-radiation.ts';
import { pointSource } from './radiation/point-source.ts';
import { shokriBeyler } from './radiation/shokri-beyler.ts';
import { solidFlame } from './radiation/solid-flame.ts';
import { viewCylinder } from './radiation/view-cylinder.ts';
import { viewRectangle } from './radiation/view-rectangle.ts';
import { poolFire } from './pool/pool-fire.ts';
import { spillArea } from './pool/spill-area.ts';
import { thinSpill } from './pool/thin-spill.ts';
import { carbonMonoxide } from './smoke/carbon-monoxide.ts';
import { layerFillingSteady, layerFillingGrowing } from './smoke/layer-filling.ts';
import { massForVisibility } from './smoke/mass-for-visibility.ts';
import { oxygenEnd } from './smoke/oxygen-end.ts';
import { oxygenLimitedHeat } from './smoke/oxygen-limited-heat.ts';
import { sootMass } from './smoke/soot-mass.ts';
import { visibility } from './smoke/visibility.ts';
import { balanceFlow } from './water/balance-flow.ts';
import { heatUptake } from './water/heat-uptake.ts';
import { observedFlowLondon, ruleOfIowa, jetsUsed } from './water/observed-flows.ts';
import { cableRun } from './storage/cable-run.ts';
import { cableTray } from './storage/cable-tray.ts';
import { charringHeat } from './storage/charring-heat.ts';
import { gasCylinder } from './storage/gas-cylinder.ts';
import { liningHeat } from './storage/lining-heat.ts';
import { lithiumBattery } from './storage/lithium-battery.ts';
import { palletStack } from './storage/pallet-stack.ts';
import { storageHeight } from './storage/storage-height.ts';
import { designLoadSpanish } from './load/design-load-spanish.ts';
import { woodEquivalent } from './load/wood-equivalent.ts';
import { dustLayer, dustThresholds } from './storage/dust.ts';
import { designLoadItalian } from './load/design-load-italian.ts';
import { gradingClass } from './load/grading-class.ts';
import { olderUnits } from './load/older-units.ts';
import { pertFractile } from './statistics/pert-fractile.ts';
import { triangularFractile } from './statistics/triangular-fractile.ts';
import { varianceShare } from './uncertainty/variance-share.ts';
import { MONTE_CARLO_METHOD } from './models/monte-carlo-method.ts';
import { HOW_MANY_METHOD, WHAT_CHANGES_METHOD } from './models/question-method.ts';
import { GAP_METHOD, SPREAD_METHOD } from './models/spread-method.ts';
import type { MethodSummary } from './define-method.ts';

/** A method whose inputs and result are known only when it runs. */
export interface AnyMethod extends MethodSummary {
  run(inputs: Readonly<Record<string, number | string | readonly number[]>>): unknown;
}

/** Every method of the book, by topic. A method that is not listed here is not used. */
export const METHODS: readonly AnyMethod[] = [
  asKept,
  characteristicLoad,
  combustionFactor,
  deltaN,
  deltaQ1,
  deltaQ2,
  designLoad,
  enclosureFactor,
  fireLoad,
  floorToEnclosure,
  localPeak,
  perEnclosure,
  perFloor,
  protectedLoads,
  grossAsReceived,
  grossAshFree,
  fromVolume,
  grossDry,
  mixture,
  moistureEn,
  netDry,
  statedHeat,
  moistureWetBasis,
  netAsReceived,
  netFromGross,
  gumbelFractile,
  gumbelPlace,
  lognormalFractile,
  lognormalPlace,
  bandFractile,
  fireLoadUncertainty,
  perFloorUncertainty,
  varianceShare,
  designFire,
  fuelPlateau,
  sumOfPeaks,
  growthCoefficient,
  heatReleased,
  openingsPlateau,
  plateau,
  timeToReach,
  enclosureAreas,
  flashoverBabrauskas,
  flashoverMqh,
  flashoverThomas,
  hotLayerMqh,
  inverseOpeningFactor,
  kawagoe,
  liningHeatTransfer,
  meanHeatTransfer,
  openingFactor,
  openings,
  roofVentEquivalent,
  ventilationLimit,
  conversionFactor,
  equivalentTimeJcss,
  equivalentTimeLaw,
  equivalentTimePettersson,
  equivalentTime,
  unprotectedSteelFactor,
  meanThermalInertia,
  standardCurve,
  externalCurve,
  hydrocarbonCurve,
  parametricCurve,
  smallRoomWeight,
  thermalInertia,
  ventilationWeight,
  basisCorrection,
  basisDetector,
  boie,
  channiwalaParikh,
  combustionEfficiency,
  completeCombustion,
  gasMoles,
  heatFromEquation,
  heatFromFormation,
  netOfFormula,
  oxygenDemand,
  substanceMass,
  thornton,
  airBuoyancy,
  bombAcceptance,
  bombCalibration,
  bombGross,
  bombRun,
  calibrationMean,
  constantPressure,
  constantVolume,
  curveHeat,
  effectiveHeat,
  netFromCondensate,
  orificeConstant,
  oxygenCarbon,
  oxygenConsumption,
  waterEfficiency,
  waterHeat,
  closedRoom,
  dealBeylerTransfer,
  forcedDealBeyler,
  forcedFpa,
  ceilingJet,
  detectorResponse,
  detectorSteady,
  farField,
  flameHeight,
  localisedAtCeiling,
  localisedBelowCeiling,
  plumeMassFlow,
  plumeTemperature,
  plumeVelocity,
  rtiFromFeet,
  smokeIndicator,
  sprinklerLimited,
  travellingTime,
  virtualOrigin,
  emissivePower,
  externalFlame,
  openingRadiation,
  boundaryRadiation,
  pointSource,
  shokriBeyler,
  solidFlame,
  viewCylinder,
  viewRectangle,
  poolFire,
  spillArea,
  thinSpill,
  carbonMonoxide,
  layerFillingSteady,
  layerFillingGrowing,
  massForVisibility,
  oxygenEnd,
  oxygenLimitedHeat,
  sootMass,
  visibility,
  balanceFlow,
  heatUptake,
  observedFlowLondon,
  ruleOfIowa,
  jetsUsed,
  cableRun,
  cableTray,
  charringHeat,
  gasCylinder,
  liningHeat,
  lithiumBattery,
  palletStack,
  storageHeight,
  designLoadItalian,
  designLoadSpanish,
  woodEquivalent,
  dustLayer,
  dustThresholds,
  gradingClass,
  olderUnits,
  pertFractile,
  triangularFractile,
];

/** Models of many parts: no one relation to run, held to whole cases. */
export const MODELS: readonly MethodSummary[] = [
  SPREAD_METHOD,
  GAP_METHOD,
  HOW_MANY_METHOD,
  WHAT_CHANGES_METHOD,
  MONTE_CARLO_METHOD,
];

const byRef = new Map<string, MethodSummary>([...METHODS, ...MODELS].map((method) => [method.ref, method]));

/** The method or model an estimate names, as `load.per-floor@1`; undefined for a version this engine no longer has. */
export function methodByRef(ref: string): MethodSummary | undefined {
  return byRef.get(ref);
}
