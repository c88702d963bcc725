import type { ReactNode } from 'react';
import type { Estimate, InputOrigin, WorkingInput, WorkingStep } from '@embertally/shared/methods/estimate';
import { FormulaText } from './formula-text.tsx';
import { plainUnits } from '../../lib/plain-units.ts';
import { UnitText } from './unit-text.tsx';
import { useQuantity } from '../../lib/use-quantity.ts';
import { WarningList } from './warning-list.tsx';
import './working.css';

const ORIGINS: Readonly<Record<InputOrigin, string>> = {
  given: 'recorded in the survey',
  measured: 'measured on site',
  catalogue: 'from the catalogue',
  default: 'taken by default',
  computed: 'computed before',
};

interface WorkingViewProps {
  /** Computed with workings. */
  readonly estimate: Estimate;
  /** Level of the headings inside. */
  readonly level?: 2 | 4;
  /** What the number is called; tells its table apart from those of other numbers. */
  readonly name: string;
  /** A number laid out above that has the same sources, assumptions and reasons: they are not said again. */
  readonly sameAs?: string | undefined;
}

/** How one number came about: relation, what went in and where it came from, steps, sources, range, reasons. */
export function WorkingView({ estimate, name, level = 2, sameAs }: WorkingViewProps) {
  const Heading = level === 2 ? 'h2' : 'h4';
  const show = useQuantity();
  const value = estimate.value === null ? null : show(estimate.value, estimate.unit);
  const inputs = estimate.inputs ?? [];
  const steps = (estimate.steps ?? []).filter((step) => step.equation !== estimate.equation);
  return (
    <div className="working grid grid-cols-[minmax(0,1fr)] gap-4">
      <p className="text-lead">
        {estimate.symbol !== undefined && (
          <span className="font-bold">
            <FormulaText>{estimate.symbol}</FormulaText> ={' '}
          </span>
        )}
        {value === null ? (
          <span>never: {estimate.never}</span>
        ) : (
          <>
            <span className="figure font-bold">{value.text}</span>{' '}
            <span className="text-soft">
              <UnitText unit={value.unit} />
            </span>
          </>
        )}
      </p>
      <WarningList warnings={estimate.warnings} />
      <section>
        <Heading>The relation</Heading>
        <p>{estimate.title}</p>
        {estimate.equation !== undefined && (
          <p className="working-equation">
            <FormulaText>{estimate.equation}</FormulaText>
          </p>
        )}
      </section>
      {inputs.length > 0 && <InputTable name={name} inputs={inputs} heading={<Heading>What went in</Heading>} />}
      {steps.length > 0 && (
        <section>
          <Heading>Step by step</Heading>
          <ol className="grid gap-1">
            {steps.map((step, index) => (
              <li key={`${String(index)} ${step.text}`} className="border-b border-rule pb-1 break-words">
                <FormulaText>{plainUnits(step.text)}</FormulaText>
                {step.value != null && !step.text.trimEnd().endsWith('=') ? ' = ' : ' '}
                <StepValue step={step} />
                {step.equation !== undefined && (
                  <span className="working-equation">
                    <FormulaText>{step.equation}</FormulaText>
                  </span>
                )}
              </li>
            ))}
          </ol>
        </section>
      )}
      <section>
        <Heading>Where it comes from</Heading>
        {sameAs !== undefined && <p className="text-soft">As above, for “{sameAs}”; taken as so there as well.</p>}
        <ul className="grid gap-1 empty:hidden">
          {(sameAs === undefined ? (estimate.sources ?? []) : []).map((source) => (
            <li key={`${source.title} ${source.locator}`}>
              {source.title}
              {source.edition !== undefined && ` (${source.edition})`}, <FormulaText>{source.locator}</FormulaText>
              {source.fromMemory === true && (
                <span className="text-soft"> – taken from memory of the source, to be read again</span>
              )}
            </li>
          ))}
        </ul>
      </section>
      {sameAs === undefined && (estimate.assumptions ?? []).length > 0 && (
        <section>
          <Heading>Taken as so</Heading>
          <ul className="list-disc pl-5">
            {estimate.assumptions?.map((text) => (
              <li key={text}>
                <FormulaText>{plainUnits(text)}</FormulaText>
              </li>
            ))}
          </ul>
        </section>
      )}
      {sameAs === undefined && estimate.why !== undefined && (
        <section>
          <Heading>Why this method</Heading>
          <p>
            <FormulaText>{plainUnits(estimate.why)}</FormulaText>
          </p>
        </section>
      )}
      <p className="figure text-small text-soft">Method {estimate.method}</p>
    </div>
  );
}

interface InputTableProps {
  readonly name: string;
  readonly inputs: readonly WorkingInput[];
  readonly heading: ReactNode;
}

function InputTable({ name, inputs, heading }: InputTableProps) {
  return (
    <section>
      {heading}
      <div role="region" aria-label={`What went into: ${name}`} tabIndex={0} className="overflow-x-auto">
        <table className="working-table w-full">
          <caption className="unseen">What went into: {name}</caption>
          <thead>
            <tr>
              <th scope="col">Symbol</th>
              <th scope="col">Quantity</th>
              <th scope="col" data-align="end">
                Value
              </th>
              <th scope="col">Valid range</th>
              <th scope="col">Origin</th>
            </tr>
          </thead>
          <tbody>
            {inputs.map((input) => (
              <tr key={input.name}>
                <th scope="row" className="whitespace-nowrap">
                  <FormulaText>{input.symbol === '' ? '–' : input.symbol}</FormulaText>
                </th>
                <td>
                  <FormulaText>{plainUnits(input.quantity)}</FormulaText>
                </td>
                <td data-align="end">
                  <InputValue input={input} />
                </td>
                <td className="text-soft">{rangeWords(input.valid)}</td>
                <td>
                  {ORIGINS[input.origin]}
                  {input.note !== undefined && <span className="block text-soft">{input.note}</span>}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}

/** A bound that only keeps out zero is said so. */
function rangeWords(valid: string | undefined): string {
  return valid?.replace(/^\d(?:\.\d+)?e-\d+ (?=or more|to )/, 'above 0 ').replace('above 0 or more', 'above 0') ?? '–';
}

/** Inputs stand in the units of the relation, whatever the person reads in: the arithmetic must be followable. */
function InputValue({ input }: { readonly input: WorkingInput }) {
  const { value, unit } = input;
  if (value === null) return <span className="text-soft">–</span>;
  const text = typeof value === 'number' ? Number(value.toPrecision(6)).toLocaleString('en-GB', TO_SIX) : value;
  return (
    <>
      <span className="figure">{text}</span>{' '}
      <span className="text-soft">
        <UnitText unit={unit} />
      </span>
    </>
  );
}

const TO_SIX = { maximumSignificantDigits: 6, useGrouping: false } as const;

function StepValue({ step }: { readonly step: WorkingStep }) {
  if (step.value === undefined || step.value === null) return null;
  const text = typeof step.value === 'number' ? step.value.toLocaleString('en-GB', TO_SIX) : step.value;
  return (
    <span className="whitespace-nowrap">
      <span className="figure font-bold">{text}</span>{' '}
      <span className="text-soft">
        <UnitText unit={step.unit ?? ''} />
      </span>
    </span>
  );
}
