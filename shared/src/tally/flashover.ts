import { estimate, type Estimate, type EstimateWarning } from '../methods/estimate.ts';
import { figure } from '../methods/figure.ts';
import { flashoverBabrauskas } from '../methods/room/flashover-babrauskas.ts';
import { flashoverMqh } from '../methods/room/flashover-mqh.ts';
import { flashoverThomas } from '../methods/room/flashover-thomas.ts';
import type { WorkingStep } from '../methods/working.ts';
import type { RoomAreas } from './room-areas.ts';
import type { OpeningStage } from './room-openings.ts';
import type { FlashoverCriterion } from './room-tally.ts';

const LARGEST_FLOOR_M2 = 500;
const HIGHEST_MQH_M = 6;
const BABRAUSKAS = { least: 9, most: 65 } as const;
/** Oxygen limit, kW per m^5/2: a criterion at or above it cannot be reached. */
const LIMIT = 1500;

export interface HeatTransfer {
  readonly value: number;
  readonly steps: readonly WorkingStep[];
  readonly warnings: readonly EstimateWarning[];
}

export interface Criteria {
  readonly thomas: FlashoverCriterion;
  readonly babrauskas: FlashoverCriterion;
  /** Absent while a lining is unknown. */
  readonly mqh?: FlashoverCriterion;
}

/** The three criteria for one stage of openings (F > 0, A_T > 0), each with its range and whether it applies. */
export function flashoverCriteria(
  areas: RoomAreas,
  stage: OpeningStage,
  transfer: HeatTransfer | undefined,
  context: { readonly workings: boolean; readonly warnings: readonly EstimateWarning[] },
): Criteria {
  const { floor: A_f, height: H } = areas;
  const { factor: F, liningArea: A_T } = stage;
  const ratio = A_T / F;
  const tooLarge = A_f > LARGEST_FLOOR_M2 ? `The floor of ${figure(A_f)} m2 is larger than 500 m2.` : undefined;
  const thomas = estimate(flashoverThomas, { A_T, F, A_f }, context);
  const babrauskas = estimate(flashoverBabrauskas, { F, A_T_per_F: ratio }, context);
  const outside =
    ratio < BABRAUSKAS.least || ratio > BABRAUSKAS.most
      ? `A_T/(A √H) is ${figure(ratio)} m-1/2, outside the tested 9 to 65.`
      : undefined;
  const tooHigh = H > HIGHEST_MQH_M ? `The room is ${figure(H)} m high, more than 6 m.` : undefined;
  return {
    thomas: criterion(thomas, 'floor up to about 150 m2, not above 500 m2', tooLarge ?? unreachable(thomas, F)),
    babrauskas: criterion(babrauskas, 'A_T/(A √H) from 9 to 65 m-1/2', outside ?? unreachable(babrauskas, F)),
    ...(transfer && {
      mqh: mqhCriterion({ A_f, H, A_T, F }, transfer, tooLarge ?? tooHigh, context),
    }),
  };
}

function mqhCriterion(
  inputs: { A_f: number; H: number; A_T: number; F: number },
  transfer: HeatTransfer,
  why: string | undefined,
  context: { readonly workings: boolean; readonly warnings: readonly EstimateWarning[] },
): FlashoverCriterion {
  const mqh = estimate(
    flashoverMqh,
    { ...inputs, h_k: transfer.value },
    {
      workings: context.workings,
      warnings: [...context.warnings, ...transfer.warnings],
      steps: transfer.steps,
    },
  );
  const range = 'tested to 12 m2 of floor and 2.7 m; not above 500 m2 or 6 m';
  return criterion(mqh, range, why ?? unreachable(mqh, inputs.F));
}

function unreachable({ value }: Estimate, F: number): string | undefined {
  if ((value ?? 0) < LIMIT * F) return undefined;
  return `It would take ${figure(value ?? 0)} kW, but the openings can feed ${figure(LIMIT * F)} kW only.`;
}

function criterion(value: Estimate, range: string, why: string | undefined): FlashoverCriterion {
  return why === undefined ? { ...value, range, applicable: true } : { ...value, range, applicable: false, why };
}

/** The lowest criterion that applies. */
export function lowestApplicable({ thomas, babrauskas, mqh }: Criteria): FlashoverCriterion | undefined {
  return [thomas, babrauskas, ...(mqh ? [mqh] : [])]
    .filter((one) => one.applicable)
    .sort((a, b) => (a.value ?? 0) - (b.value ?? 0))[0];
}

/** Whether the air of these openings starves every fire before any criterion: nothing applies for want of air. */
export function starved(criteria: Criteria, stage: OpeningStage): boolean {
  const F = stage.factor;
  const beyond = (one: FlashoverCriterion) => (one.value ?? 0) >= LIMIT * F;
  return (
    stage.liningArea / F > BABRAUSKAS.most &&
    beyond(criteria.thomas) &&
    (criteria.mqh === undefined || beyond(criteria.mqh))
  );
}
