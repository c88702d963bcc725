import type { MethodSummary } from '@embertally/shared/methods/define-method';
import { METHODS, MODELS } from '@embertally/shared/methods/registry';
import { rangeText } from '@embertally/shared/methods/range-faults';
import { KNOWN_LIMITS } from './known-limits.ts';
import { referenceRows, type HeldRow } from './reference-rows.ts';

const HELD_TO = { published: 'published', independent: 'independently computed', invariant: 'invariant' } as const;
const cell = (text: string): string => text.replaceAll('|', '\\|');

/** Headings by the first word of the id, in the order of a tally; a topic that is new comes last under its own name. */
const TOPICS: Readonly<Record<string, string>> = {
  load: 'Load',
  heat: 'Heats and moisture',
  chemistry: 'Chemistry',
  calorimetry: 'Calorimetry',
  statistics: 'Distributions',
  uncertainty: 'Uncertainty',
  growth: 'Design fire',
  room: 'Openings, flashover and hot layer',
  temperature: 'Gas before flashover',
  burnout: 'Burn-out',
  plume: 'Flames, plumes, ceiling jets and detectors',
  radiation: 'Radiation',
  pool: 'Liquids',
  smoke: 'Smoke and air',
  storage: 'Stored goods, cables, linings, batteries and cylinders',
  water: 'Water',
  spread: 'Which entry ignites which',
  question: 'Questions turned round',
};

const topicOf = ({ id }: MethodSummary): string => id.split('.', 1)[0]!;
const ALL: readonly MethodSummary[] = [...METHODS, ...MODELS];

/** The tables of methods as they stand in SAFETY.md, made of what the methods declare and of the rows that hold them. */
export async function methodsTable(): Promise<string> {
  const rows = await referenceRows();
  const topics = [...new Set([...Object.keys(TOPICS), ...ALL.map(topicOf)])];
  return topics
    .map((topic) => [topic, ALL.filter((method) => topicOf(method) === topic)] as const)
    .filter(([, methods]) => methods.length > 0)
    .map(([topic, methods]) => `### ${TOPICS[topic] ?? topic}\n\n${tableOf(methods, rows)}`)
    .join('\n');
}

function tableOf(methods: readonly MethodSummary[], rows: readonly HeldRow[]): string {
  const lines = methods.map((method) => {
    const sources = method.sources
      .map(
        (s) =>
          `${s.title}${s.edition === undefined ? '' : ` (${s.edition})`}, ${s.locator}${s.fromMemory === true ? ' *(from memory)*' : ''}`,
      )
      .join('; ');
    const ranges = Object.values(method.inputs)
      .flatMap((input) =>
        'choices' in input
          ? []
          : [`${input.symbol || input.quantity} ${rangeText(input.valid)}${input.unit === '' ? '' : ` ${input.unit}`}`],
      )
      .join('; ');
    const held = (Object.keys(HELD_TO) as (keyof typeof HELD_TO)[])
      .map(
        (origin) =>
          [rows.filter((row) => row.method === method.id && row.origin === origin).length, HELD_TO[origin]] as const,
      )
      .flatMap(([count, word]) => (count > 0 ? [`${count} ${word}`] : []))
      .join(', ');
    const gives = `${[method.title, method.symbol].filter(Boolean).join(', ')}${method.unit === '' ? '' : ` in ${method.unit}`}`;
    const outside = method.outOfRange === 'warn' ? 'warned' : 'refused';
    const limits = [KNOWN_LIMITS[method.id], ...method.assumptions].filter((text) => text !== undefined).join(' ');
    return `| \`${method.id}\` | ${cell(gives)} | ${cell(sources)} | ${cell(ranges || 'named cases only')} (${outside}) | ${held} | ${method.version} | ${cell(limits || method.why)} |`;
  });
  const head =
    '| method | what it gives | source | range (outside: warned or refused) | held to | version | known limits, misprints and assumptions |\n|---|---|---|---|---|---|---|';
  return `${head}\n${lines.join('\n')}\n`;
}
