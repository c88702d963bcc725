import { conversionFactor } from '../methods/burnout/conversion-factor.ts';
import { equivalentTime } from '../methods/burnout/equivalent-time.ts';
import { unprotectedSteelFactor } from '../methods/burnout/material-factor.ts';
import { ventilationWeight } from '../methods/burnout/ventilation-weight.ts';
import { estimate, type Estimate, type EstimateWarning } from '../methods/estimate.ts';
import { figure } from '../methods/figure.ts';
import { rangeFaults } from '../methods/range-faults.ts';
import type { BurnoutGiven } from './burnout-given.ts';
import { cellulosicShare, LEAST_CELLULOSIC, NOT_CELLULOSIC } from './cellulosic-share.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

const ALPHA_V = { least: 0.025, most: 0.25 } as const;
const UNKNOWN_LINING = { EN: 0.07, UK: 0.09 } as const;

/** Equivalent time of exposure with one load; missing where the annex does not reach. */
export function equivalentTimeOf(
  path: string,
  q_fd: number,
  loadWarnings: readonly EstimateWarning[],
  inertia: Estimate | undefined,
  given: BurnoutGiven,
  context: TallyContext,
): Estimate | undefined {
  const { areas, openings } = given;
  const alpha = openings.outsideArea / areas.floor;
  if (alpha < ALPHA_V.least) {
    const why = `Openings to the outside are ${figure(alpha * 100)} % of the floor; below 2.5 % the method would read too low.`;
    return noteMissing(context, path, 'room.openings', why);
  }
  const member = memberFactor(given);
  if (typeof member === 'string') return noteMissing(context, path, 'options.kc', member);
  const kb = conversionOf(given, inertia);
  const weightInputs = {
    H: areas.height,
    alpha_v: Math.min(ALPHA_V.most, alpha),
    alpha_h: openings.roofVents / areas.floor,
  };
  const faults = rangeFaults(ventilationWeight, weightInputs);
  if (faults.length > 0) {
    return noteMissing(context, path, 'room.roof_vents_m2', faults.map((fault) => fault.text).join(' '));
  }
  const weight = ventilationWeight.run(weightInputs);
  return estimate(
    equivalentTime,
    { q_fd, k_b: kb.value, w_f: weight.w_f, k_c: member },
    {
      workings: context.workings,
      warnings: [...loadWarnings, ...kb.warnings, ...situation(given, alpha)],
      origins: { k_b: kb.origin, k_c: given.input.options?.kc == null ? 'default' : 'given' },
      steps: context.workings
        ? [
            { text: 'α_v, openings to the outside over the floor', value: alpha, unit: '' },
            { text: 'w_f', equation: ventilationWeight.equation, value: weight.w_f, unit: '' },
            { text: 'k_b', equation: conversionFactor.equation, value: kb.value, unit: 'min m2/MJ' },
          ]
        : [],
    },
  );
}

/** k_c, or why there is none. */
function memberFactor({ input, openings }: BurnoutGiven): number | string {
  const kc = input.options?.kc ?? 1;
  if (typeof kc === 'number') return kc;
  if (kc !== 'unprotected_steel') return `The annex excludes ${kc} members.`;
  const faults = rangeFaults(unprotectedSteelFactor, { O: openings.afterGlass.openingFactor });
  if (faults.length > 0) return faults.map(({ text }) => text).join(' ');
  return unprotectedSteelFactor.run({ O: openings.afterGlass.openingFactor });
}

interface Conversion {
  readonly value: number;
  readonly origin: 'given' | 'computed' | 'default';
  readonly warnings: readonly EstimateWarning[];
}

function conversionOf({ input }: BurnoutGiven, inertia: Estimate | undefined): Conversion {
  const kb = input.options?.kb ?? 'EN';
  if (typeof kb === 'number') return { value: kb, origin: 'given', warnings: [] };
  if (inertia) {
    const value = conversionFactor.run({ b: inertia.value ?? 0, table: kb });
    return { value, origin: 'computed', warnings: inertia.warnings };
  }
  return {
    value: UNKNOWN_LINING[kb],
    origin: 'default',
    warnings: [
      {
        code: 'LINING_UNKNOWN',
        text: `The linings are not known: k_b ${UNKNOWN_LINING[kb]} is taken, the largest of the table.`,
      },
    ],
  };
}

function situation({ areas, heats }: BurnoutGiven, alpha: number): EstimateWarning[] {
  const warnings: EstimateWarning[] = [];
  if (alpha > ALPHA_V.most) {
    warnings.push({
      code: 'OPENINGS_ABOVE_RANGE',
      text: `Openings to the outside are ${figure(alpha * 100)} % of the floor; the largest of the method, 25 %, is used and reads a little high.`,
    });
  }
  if (areas.floor > 500 || areas.height > 4) {
    warnings.push({
      code: 'BEYOND_TESTED_SIZE',
      text: `The room (floor ${figure(areas.floor)} m2, height ${figure(areas.height)} m) is larger than those behind the method: 500 m2, 4 m.`,
    });
  }
  if (cellulosicShare(heats) < LEAST_CELLULOSIC) warnings.push(NOT_CELLULOSIC);
  return warnings;
}
