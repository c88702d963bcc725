import { useByKey } from '../catalogue/uses.ts';
import { estimate, type Estimate, type EstimateWarning } from '../methods/estimate.ts';
import { designLoad } from '../methods/load/design-load.ts';
import { deltaN } from '../methods/load/delta-n.ts';
import { deltaQ1 } from '../methods/load/delta-q1.ts';
import { DANGER_OF_ACTIVATION, deltaQ2 } from '../methods/load/delta-q2.ts';
import type { RoomAreas } from './room-areas.ts';
import type { RoomInput, RoomInputProtection } from './room-input.ts';
import type { TallyContext } from './tally-context.ts';

/** The design load: what is kept, times the factors for size, danger of activation and protection. */
export function designLoadOf(
  input: RoomInput,
  areas: RoomAreas,
  m: number,
  characteristic: { readonly value: number; readonly warnings: readonly EstimateWarning[] },
  context: TallyContext,
): Estimate {
  const { room, options } = input;
  const compartment = room.compartment_floor_m2 ?? null;
  const delta_q1 = deltaQ1.run({ A_f: compartment ?? areas.floor, reading: options?.area_factor ?? 'linear' });
  const danger = room.danger_of_activation ?? null;
  const usual = room.use == null ? null : (useByKey(room.use)?.danger_of_activation ?? null);
  const delta_q2 = deltaQ2.run({ chosen: danger ?? usual ?? 1 });
  const protection = protectionInputs(room.protection);
  const delta_n = deltaN.run(protection);
  const warnings: EstimateWarning[] = [...characteristic.warnings];
  if (danger !== null && !DANGER_OF_ACTIVATION.some((value) => value === danger)) {
    warnings.push({ code: 'DANGER_NOT_IN_TABLE', text: `A danger of activation of ${danger} is not in the table.` });
  }
  if (danger === null && usual === null) {
    warnings.push({ code: 'DANGER_ASSUMED', text: 'The danger of activation is not stated; 1.00 is assumed.' });
  }
  if (compartment === null && room.bounded_by_rated_construction === false) {
    warnings.push({
      code: 'COMPARTMENT_IS_LARGER',
      text: 'The room is not bounded by rated construction: the compartment is larger than the room. State its floor area.',
    });
  }
  warnings.push(...measureWarnings(protection));
  return estimate(
    designLoad,
    { q_fk: characteristic.value, m, delta_q1, delta_q2, delta_n },
    {
      workings: context.workings,
      warnings,
      origins: {
        delta_q1: { origin: 'computed', note: compartment === null ? 'floor of the room' : 'stated compartment floor' },
        delta_q2: danger !== null ? 'given' : usual !== null ? 'catalogue' : 'default',
        delta_n: { origin: 'computed', note: room.protection == null ? 'protection unknown' : 'from the protection' },
      },
      steps: context.workings
        ? [
            { text: `δ_q1, ${deltaQ1.equation}`, value: delta_q1, unit: '' },
            { text: 'δ_q2, danger of activation', value: delta_q2, unit: '' },
            ...(deltaN.explain?.(protection, delta_n) ?? []),
            { text: 'Π δ_n', value: delta_n, unit: '' },
          ]
        : [],
    },
  );
}

function protectionInputs(given: RoomInputProtection | null | undefined) {
  const transmission = given?.alarm_to_brigade ?? null;
  return {
    sprinklers: given == null ? 'unknown' : given.sprinklers == null ? 'no' : 'yes',
    supplies: given?.independent_water_supplies ?? 0,
    detection: given?.detection ?? 'unknown',
    transmission: transmission === null ? 'unknown' : transmission ? 'yes' : 'no',
    brigade: given?.brigade ?? 'unknown',
    access: given?.access_routes ?? 'unknown',
    devices: given?.firefighting_devices ?? 'unknown',
    smoke: given?.stair_smoke_exhaust ?? 'unknown',
  } as const;
}

/** The three measures that are taken as present when nothing is known about them, each worth 1.5 if they are not. */
function measureWarnings({ access, devices, smoke }: ReturnType<typeof protectionInputs>): EstimateWarning[] {
  const unknown = [
    ...(access === 'unknown' ? ['access routes'] : []),
    ...(devices === 'unknown' ? ['fire-fighting devices'] : []),
    ...(smoke === 'unknown' ? ['smoke exhaust of stairs'] : []),
  ];
  if (unknown.length === 0) return [];
  return [
    {
      code: 'MEASURE_ASSUMED_PRESENT',
      text: `Not known, assumed present: ${unknown.join(', ')}. The design load is 1.5 times larger for each that is missing.`,
    },
  ];
}
