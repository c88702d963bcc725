import type { MethodSummary } from '@embertally/shared/methods/define-method';
import { rangeText } from '@embertally/shared/methods/range-faults';
import { METHODS, MODELS } from '@embertally/shared/methods/registry';

export interface MethodRow {
  readonly ref: string;
  readonly title: string;
  readonly gives: string;
  readonly equation: string;
  readonly ranges: readonly string[];
  /** What happens outside the range. */
  readonly outside: string;
  readonly sources: readonly { readonly text: string; readonly fromMemory: boolean }[];
  /** Everything a person may look for, in small letters. */
  readonly words: string;
}

export interface MethodTopic {
  readonly title: string;
  readonly methods: readonly MethodRow[];
}

/** Topics by the first part of a method's id, in the order of the job. */
const TOPICS: Readonly<Record<string, string>> = {
  load: 'Fire load',
  heat: 'Heat of materials',
  chemistry: 'Chemistry',
  calorimetry: 'Calorimetry',
  statistics: 'Distributions',
  uncertainty: 'How sure',
  growth: 'How fast it could come out',
  room: 'The room and its openings',
  temperature: 'Gas before flashover',
  burnout: 'Burn-out',
  plume: 'Plumes, ceilings, devices',
  radiation: 'Radiation',
  pool: 'Liquids',
  smoke: 'Smoke and air',
  water: 'Water',
  storage: 'Stored goods',
  spread: 'What sets what alight',
  question: 'Questions',
};
const OTHER = 'Further methods';

/** Every method and model of the book as a table shows it, by topic. */
export function methodSummaries(): readonly MethodTopic[] {
  const topics = new Map<string, MethodRow[]>(Object.values(TOPICS).map((title) => [title, []]));
  for (const method of [...METHODS, ...MODELS]) {
    const title = TOPICS[method.id.split('.', 1)[0] ?? ''] ?? OTHER;
    const rows = topics.get(title);
    if (rows) rows.push(rowOf(method));
    else topics.set(title, [rowOf(method)]);
  }
  return [...topics].filter(([, methods]) => methods.length > 0).map(([title, methods]) => ({ title, methods }));
}

function rowOf({ ref, title, symbol, unit, equation, inputs, outOfRange, sources }: MethodSummary): MethodRow {
  const named = sources.map(({ title: work, edition, locator, fromMemory }) => ({
    text: `${work}${edition === undefined ? '' : ` (${edition})`}, ${locator}`,
    fromMemory: fromMemory ?? false,
  }));
  return {
    ref,
    title,
    gives: [symbol, unit === '' ? '' : `in ${unit}`].filter(Boolean).join(' '),
    equation,
    ranges: Object.values(inputs).flatMap((input) => {
      if ('choices' in input) return [];
      const range = rangeText(input.valid).replace(/^\d(?:\.\d+)?e-\d+ (?=or more|to )/, 'above 0 ');
      return [`${input.symbol || input.quantity} ${range}${input.unit === '' ? '' : ` ${input.unit}`}`];
    }),
    outside: outOfRange === 'warn' ? 'computed outside it, with a note' : 'not computed outside it',
    sources: named,
    words: [ref, title, ...named.map(({ text }) => text)].join(' ').toLowerCase(),
  };
}
