import type { EstimateWarning } from '../methods/estimate.ts';
import type { WorkingInput } from '../methods/working.ts';
import { computedInput } from '../spread/computed-input.ts';
import { modelEstimate } from '../spread/model-estimate.ts';
import type { SpreadEvent } from '../spread/run-spread.ts';
import type { SpreadInput, SpreadResult } from '../spread/simulate-spread.ts';
import type { SpreadEntry } from '../spread/spread-entry.ts';
import { SPREAD_METHOD } from '../methods/models/spread-method.ts';
import type { SpreadTallyEvent } from './room-tally.ts';
import type { TallyContext } from './tally-context.ts';

const NO_WARNINGS: readonly EstimateWarning[] = [];
const NEAR_FIELD: readonly EstimateWarning[] = [
  {
    code: 'NEAR_FIELD',
    text: 'The source stands nearer than 2.5 of its diameters, where the point source has not been tested.',
  },
];

/** The events of a fire in order of time, as estimates. */
export function spreadEvents(
  fire: SpreadResult,
  input: SpreadInput,
  nameOf: (id: string) => string,
  context: TallyContext,
): SpreadTallyEvent[] {
  const entries = new Map(input.entries.map((entry) => [entry.id, entry]));
  return fire.events.map((event) => {
    const warnings = event.nearField ? NEAR_FIELD : NO_WARNINGS;
    const entry = event.id === null ? undefined : entries.get(event.id);
    const describe = context.workings
      ? () => ({ inputs: inputsOf(entry), steps: [{ text: causeText(event, nameOf) }] })
      : undefined;
    const { id, t, cause, flux_kW_m2, from, nearField } = event;
    return {
      id,
      t: modelEstimate(SPREAD_METHOD, 'ignition', { value: t, warnings }, describe),
      cause,
      ...(flux_kW_m2 !== null && {
        flux: modelEstimate(SPREAD_METHOD, 'flux', { value: flux_kW_m2, warnings }, describe),
        from,
        nearField,
      }),
    };
  });
}

function causeText({ cause, from }: SpreadEvent, nameOf: (id: string) => string): string {
  switch (cause) {
    case 'first':
      return 'It burns first.';
    case 'radiation':
      return `Lit by radiation, most of it from ${from === null ? 'the layer' : nameOf(from)}.`;
    case 'layer':
      return 'Lit by the hot layer, which gives half of the flux or more.';
    case 'flame':
      return `Reached by the flame of ${from === null ? 'what burns below' : nameOf(from)}.`;
    case 'flashover':
      return 'Lit by flashover.';
    case 'starved':
      return 'The air of the closed room is used up.';
  }
}

function inputsOf(entry: SpreadEntry | undefined): WorkingInput[] {
  if (!entry) return [];
  const { ignition, peak_kW, heat_MJ, radiativeFraction } = entry;
  return [
    computedInput('q_cr', 'q_cr', 'Critical flux of this entry', 'kW/m2', ignition.critical_kW_m2),
    computedInput('dose', 'dose', 'Dose that lights this entry', '(kW/m2)^n s', ignition.dose),
    computedInput('n', 'n', 'Exponent of the dose', '', ignition.exponent),
    computedInput('Q_p', 'Q_p', 'Peak of this entry', 'kW', peak_kW),
    computedInput('E_i', 'E_i', 'Heat of this entry', 'MJ', heat_MJ),
    computedInput('chi_r', 'χ_r', 'Share of it that radiates', '', radiativeFraction),
  ];
}
