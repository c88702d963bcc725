/**
 * What is known against a method beyond its range: misprints in circulation, sources that disagree, steps and jumps, and
 * how far off it has been seen to be. By the method's id; stands in SAFETY.md beside what the method assumes.
 */
export const KNOWN_LIMITS: Readonly<Record<string, string>> = {
  'load.combustion-factor':
    'Counted once only: other schemes have it inside their density, and an effective heat already holds it.',
  'load.delta-q1-2002':
    'Only the Spanish text states a rule between the rows; the EN table is also read as steps. Other schemes print other numbers. Below 25 m² the first row is kept.',
  'load.delta-q2-2002': 'Set by national annexes; the values differ between countries.',
  'load.delta-n-2002': 'The annex is informative; several national annexes replace it or forbid it.',
  'load.enclosure-factor': 'Codes disagree for closed steel cabinets: 0, 0.85 or the 10 % rule.',
  'load.grading-class-1946':
    'Its limits are quoted in kilocalories and in British units that differ by 1.3 %, so a load between them has two classes. Above 4540 MJ/m² it is silent.',
  'load.older-units':
    'Thermochemical and International Table calories differ by 0.07 %; 275 000 kcal/m² are not 100 000 Btu/ft².',
  'load.per-enclosure': 'Three to six times smaller than the load per floor area; the two are easily mixed up.',
  'load.per-floor': 'Three to six times larger than the load per enclosing area; the two are easily mixed up.',
  'load.local-peak': 'The practice it comes from was not read again; windows of other sizes give other peaks.',
  'heat.moisture-2002':
    'The printed relation puts moisture of the dry mass into a form for the wet mass; at 12 % it is 2 % below the exact balance.',
  'heat.net-from-gross':
    'Web tables of “calorific value” are mostly gross. Bomb values are at constant volume: 0.2 % apart for hydrocarbons.',
  'heat.net-as-received': 'Ultra-wet goods come out below 0: they take more heat than they give.',
  'statistics.gumbel-fractile': 'Not for mixed shops or stock, whose spread exceeds their mean.',
  'statistics.gumbel-place': 'Not for mixed shops or stock, whose spread exceeds their mean.',
  'uncertainty.band': 'First order: far from the middle it is less sure than samples are.',
  'uncertainty.fire-load': 'Left out, the sharing of heats would understate it (258 for 287 MJ in the reference case).',
  'growth.coefficient': 'The same four names mean 1000 kW in EN and 1055 kW in NFPA, 5.5 % apart.',
  'growth.openings-plateau-2002':
    'With another factor m than its 0.8 it would pass the oxygen limit; the factor is part of the relation.',
  'growth.design-fire-2002': 'Liquids and gases end at once and do not decay from 70 %.',
  'room.flashover-thomas':
    'The three flashover criteria differ by up to a factor of two in large rooms; all are shown.',
  'room.flashover-babrauskas':
    'The tests scatter from 0.3 to 0.7 of the ventilation limit; 750 is the middle. Falls to nothing with the opening.',
  'room.flashover-mqh': 'The printed 610 is rounded down from 624. Falls with the root of the opening. h_k in kW.',
  'room.hot-layer-mqh': 'Not tested above 600 K. h_k in kW: taken in W the rise reads ten times low.',
  'room.lining-heat-transfer': 'Falls by a factor of two at the penetration time, and what is made of it steps there.',
  'room.openings-2002': 'Σ A √h, which some works use, is 1 to 3 % lower for openings of several heights.',
  'room.kawagoe': '5.5 kg/min is also quoted, 1.8 % above 0.09 kg/s.',
  'room.ventilation-limit': '1518 A √H is also quoted, 1.2 % more.',
  'burnout.parametric-2002':
    'Jumps where t_max passes t_lim (555 to 790 °C in the reference case). The pre-standard printed 0.13e-3 for 0.2e-3. Hours inside, and the load per enclosing area. k falls below 0 at the corner of the printed ranges.',
  'burnout.thermal-inertia-2002': 'Thickness matters only where the exposed layer is the heavier one.',
  'burnout.mean-thermal-inertia-2002': 'Averages without the openings, while O divides by the area with them.',
  'burnout.conversion-factor-2002': 'National annexes raise it by up to 30 %.',
  'burnout.equivalent-time-2002': 'Means something only beside a furnace rating; not for timber and composite members.',
  'burnout.ventilation-weight-2002': 'Below α_v = 0.025 clipping would be unsafe, so it is refused.',
  'burnout.equivalent-time-pettersson': '0.067 is rounded from 4.0/60; 0.5 % above the form of the model code.',
  'burnout.equivalent-time-jcss': 'Gives seconds. Its factor 4.0 has a standard deviation of 1.0.',
  'burnout.equivalent-time-law': 'The area without the floor in the original; later works take it with the floor.',
  'chemistry.heat-from-equation': 'An equation for n moles read for one gives n times the heat.',
  'chemistry.heat-from-formation':
    'Good sources disagree for hydrogen cyanide, vinyl chloride, styrene, formaldehyde and diethyl carbonate; tables of 0 K enthalpies and averages of old data are in circulation.',
  'chemistry.basis-detector':
    'Acetylene, hydrogen, carbon monoxide, hydrogen cyanide, formaldehyde, hydrogen sulfide, sulfur and nitro compounds are outside the band by nature.',
  'chemistry.combustion-efficiency':
    'Not to be multiplied with the combustion factor m: both count incomplete burning.',
  'chemistry.channiwala-parikh': 'Typical error 1.5 to 3 %.',
  'chemistry.boie': 'Typical error 1.5 to 3 %; measured woods were met within 4 %.',
  'chemistry.thornton': '± 5 % for organic substances.',
  'calorimetry.bomb-calibration':
    'Benzoic acid: 26 434 J/g in vacuum, 26 454 J/g by weight in air, 26.42 MJ/kg at constant pressure; the three are not the same quantity.',
  'calorimetry.air-buoyancy': 'Forgotten, it is 0.08 % for benzoic acid and 0.16 % for isooctane.',
  'calorimetry.orifice-constant': 'Usual values 0.040 to 0.046; others point to the analyser.',
  'calorimetry.oxygen-carbon': '28.8 g/mol for air as in the standard; 28.97 would give 0.6 % less.',
  'plume.flame-height': 'Takes the whole rate, not its convective part.',
  'plume.temperature': 'Takes the convective rate; with the whole rate it reads a third too high.',
  'plume.ceiling-jet': 'Takes the whole rate. Steps a little at r/H of 0.15 and 0.18.',
  'plume.detector-response': 'No loss by conduction and no delay of the gas: real devices respond later.',
  'plume.rti-from-feet': 'An index in feet taken for one in metres makes the device nearly twice as slow.',
  'plume.localised-at-ceiling-2002': 'Steps by 2 % at y = 1, where the printed branches do not meet.',
  'plume.localised-below-ceiling-2002':
    'Takes 0.8 of the rate as convective, as its source does; elsewhere it is 0.6 to 0.7.',
  'radiation.point-source': 'Too low nearer than 2.5 diameters. Its handbook asks for a factor of safety of 2.',
  'radiation.view-cylinder': 'The distance counts from the axis; from the edge of the flame it reads too far.',
  'radiation.emissive-power': 'A mean over pools; smoke makes large flames darker than it says.',
  'pool.fire':
    'Of its table: acetone 25.8 MJ/kg is old (28.5), transformer oil 46.4 looks gross, liquid hydrogen is 0.169 and in some reprints 0.017, kβ = 100 for alcohols is a code and no value, diesel was added later.',
  'pool.spill-area': 'Steps down from 133 to 34 m² at 95 L.',
  'pool.thin-spill': 'A fifth to a third of the rate of a deep pool; the true share of a spill is seldom known.',
  'smoke.visibility': 'Tested from 5 to 15 m. Optical density to base ten is 2.303 times smaller than extinction.',
  'smoke.carbon-monoxide': 'Short of air a fire gives ten times the yield and more.',
  'smoke.oxygen-limited-heat': 'An upper bound: the room expels air as it warms.',
  'water.balance-flow': 'Sizes nothing: required flows are set by local rules.',
  'water.observed-sardqvist': 'What was used, not what is needed. Sizes nothing.',
  'water.rule-of-iowa': 'For some 30 seconds of one tactic. Sizes nothing.',
  'water.jets-thomas': 'What was used, not what is needed. Sizes nothing.',
  'storage.pallet-stack': 'Editions print 0.027 or 0.03 for moisture, 2 to 5 % apart; older plateaus lie 30 % higher.',
  'storage.lithium-battery':
    'Heat follows kWh and mass, hardly the state of charge; the rate follows it strongly. Oxygen from the cell is not seen by oxygen consumption.',
  'storage.by-height': 'The tested heaps were of one height; in proportion is common practice and no test.',
  'storage.charring-heat-2004': 'The time is an input; with the burn-out it has to be repeated until both agree.',
  'spread.simulation':
    'No shading, draught, falling or melting matter, spread over an item, or suppression; times are a factor of two uncertain at best.',
  'spread.gap': 'A gap on paper is no barrier: only one source, still air, nothing that falls over.',
};
