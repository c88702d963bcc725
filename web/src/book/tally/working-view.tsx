import type { Estimate, InputOrigin, WorkingInput, WorkingStep } from '@embertally/shared/methods/estimate';
import { useQuantity } from './use-quantity.ts';
import { WarningList } from './warning-list.tsx';

const ORIGINS: Readonly<Record<InputOrigin, string>> = {
  given: 'recorded in the survey',
  measured: 'measured on site',
  catalogue: 'from the catalogue',
  default: 'taken by default',
  computed: 'computed before',
};

/** How one number came about: relation, what went in and where it came from, steps, sources, range, reasons. */
export function WorkingView({ estimate }: { readonly estimate: Estimate }) {
  const show = useQuantity();
  const value = estimate.value === null ? null : show(estimate.value, estimate.unit);
  const inputs = estimate.inputs ?? [];
  const steps = (estimate.steps ?? []).filter((step) => step.equation !== estimate.equation);
  return (
    <div className="working grid gap-4">
      <p className="text-lead">
        {estimate.symbol !== undefined && <span className="font-bold">{estimate.symbol} = </span>}
        {value === null ? (
          <span>never: {estimate.never}</span>
        ) : (
          <>
            <span className="figure font-bold">{value.text}</span> <span className="text-soft">{value.unit}</span>
          </>
        )}
      </p>
      <WarningList warnings={estimate.warnings} />
      <section>
        <h3>The relation</h3>
        <p>{estimate.title}</p>
        {estimate.equation !== undefined && <p className="working-equation figure">{estimate.equation}</p>}
      </section>
      {inputs.length > 0 && <InputTable inputs={inputs} />}
      {steps.length > 0 && (
        <section>
          <h3>Step by step</h3>
          <ol className="grid gap-1">
            {steps.map((step, index) => (
              <li key={`${String(index)} ${step.text}`} className="border-b border-rule pb-1">
                {step.text} <StepValue step={step} />
                {step.equation !== undefined && <span className="working-equation figure">{step.equation}</span>}
              </li>
            ))}
          </ol>
        </section>
      )}
      <section>
        <h3>Where it comes from</h3>
        <ul className="grid gap-1">
          {(estimate.sources ?? []).map((source) => (
            <li key={`${source.title} ${source.locator}`}>
              {source.title}
              {source.edition !== undefined && ` (${source.edition})`}, {source.locator}
              {source.fromMemory === true && (
                <span className="text-soft"> – taken from memory of the source, to be read again</span>
              )}
            </li>
          ))}
        </ul>
      </section>
      {(estimate.assumptions ?? []).length > 0 && (
        <section>
          <h3>Taken as so</h3>
          <ul className="list-disc pl-5">
            {estimate.assumptions?.map((text) => (
              <li key={text}>{text}</li>
            ))}
          </ul>
        </section>
      )}
      {estimate.why !== undefined && (
        <section>
          <h3>Why this method</h3>
          <p>{estimate.why}</p>
        </section>
      )}
      <p className="figure text-small text-soft">Method {estimate.method}</p>
    </div>
  );
}

function InputTable({ inputs }: { readonly inputs: readonly WorkingInput[] }) {
  return (
    <section>
      <h3 id="working-inputs">What went in</h3>
      <div role="region" aria-label="What went in" tabIndex={0} className="overflow-x-auto">
        <table className="working-table w-full">
          <caption className="unseen">What went into this number</caption>
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
                  {input.symbol}
                </th>
                <td>{input.quantity}</td>
                <td data-align="end">
                  <InputValue input={input} />
                </td>
                <td className="text-soft">{input.valid ?? '–'}</td>
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

/** Inputs stand in the units of the relation, whatever the person reads in: the arithmetic must be followable. */
function InputValue({ input }: { readonly input: WorkingInput }) {
  const { value, unit } = input;
  if (value === null) return <span className="text-soft">–</span>;
  const text = typeof value === 'number' ? Number(value.toPrecision(6)).toLocaleString('en-GB', TO_SIX) : value;
  return (
    <>
      <span className="figure">{text}</span> <span className="text-soft">{unit}</span>
    </>
  );
}

const TO_SIX = { maximumSignificantDigits: 6, useGrouping: false } as const;

function StepValue({ step }: { readonly step: WorkingStep }) {
  if (step.value === undefined || step.value === null) return null;
  const text = typeof step.value === 'number' ? step.value.toLocaleString('en-GB', TO_SIX) : step.value;
  return (
    <span className="whitespace-nowrap">
      <span className="figure font-bold">{text}</span> <span className="text-soft">{step.unit ?? ''}</span>
    </span>
  );
}
