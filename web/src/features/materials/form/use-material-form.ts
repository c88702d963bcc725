import { deriveMaterial } from '@embertally/shared/materials/derive-material';
import type { MaterialDraft, MaterialWay } from '@embertally/shared/materials/material-draft';
import type { OwnMaterialLookup } from '@embertally/shared/materials/material-lookup';
import { useDeferredValue, useMemo, useState } from 'react';
import { useForm, type FieldErrors, type Form } from '../../../components/use-form.ts';
import type { CatalogueMaterial } from '../../../lib/catalogue-materials.ts';
import { ToldError } from '../../../lib/told-error.ts';
import { useUnits } from '../../../lib/units-context.ts';
import { extrasOf } from './extras.ts';
import type { Values } from './field-spec.ts';
import { lookupIn } from './lookup-in.ts';
import { outcomeOf, type Outcome } from './outcome-of.ts';
import { placeFault } from './place-fault.ts';
import { readDraft } from './read-draft.ts';
import { sectionsOf } from './ways/sections-of.ts';

interface MaterialFormOptions {
  /** Names the form and what is kept of it. */
  readonly name: string;
  readonly way: MaterialWay;
  readonly initial: Values;
  /** What may stand in a composition. */
  readonly materials: readonly CatalogueMaterial[];
  /** `id`: made once for this form, so that sending twice makes one. */
  readonly onSend: (id: string, draft: MaterialDraft, evidence: readonly string[]) => Promise<void>;
}

export interface MaterialForm {
  readonly form: Form<Values>;
  readonly way: MaterialWay;
  /** What the typed figures come to, a moment behind the typing. */
  readonly outcome: Outcome;
  readonly materials: readonly CatalogueMaterial[];
  /** Told while a file is on its way: the form is not sent without it. */
  readonly onSendingFile: (sending: boolean) => void;
}

/** Everything stated about one material, with what it comes to; all of it is kept in the browser until it is sent. */
export function useMaterialForm({ name, way, initial, materials, onSend }: MaterialFormOptions): MaterialForm {
  const units = useUnits();
  const lookup = useMemo(() => lookupIn(materials), [materials]);
  const [begun] = useState(() => ({ id: crypto.randomUUID(), ...initial }));
  const [sendingFile, onSendingFile] = useState(false);
  const sections = sectionsOf(way);
  const form = useForm<Values>({
    name,
    initial: begun,
    keep: 'everything',
    placeFault: (pointer, values) => placeFault(pointer, sections, { ...values, way }),
    validate: (values) => {
      const read = readDraft(way, values, extrasOf(values).draft, units);
      return read.ok ? placed(faultsOf(read.draft, lookup), { ...values, way }).byField : read.errors;
    },
    submit: async (values) => {
      if (sendingFile) throw new ToldError('A file is still being sent. Wait until it is attached, or stop it.');
      const extras = extrasOf(values);
      const read = readDraft(way, values, extras.draft, units);
      if (!read.ok) return;
      const { rest } = placed(faultsOf(read.draft, lookup), { ...values, way });
      if (rest.length > 0) throw new ToldError(rest.join(' '));
      await onSend(
        values['id'] ?? begun.id,
        read.draft,
        extras.evidence.map(({ id }) => id),
      );
    },
  });
  const deferred = useDeferredValue(form.values);
  const outcome = useMemo(
    () => outcomeOf(readDraft(way, named(deferred), extrasOf(deferred).draft, units), lookup),
    [way, deferred, units, lookup],
  );
  return { form, way, outcome, materials, onSendingFile };
}

/** Its heat can be read before it has a name and a source. */
function named(values: Values): Values {
  return { ...values, label: values['label'] || '–', source: values['source'] || '–' };
}

function faultsOf(draft: MaterialDraft, lookup: OwnMaterialLookup) {
  const derived = deriveMaterial(draft, lookup);
  return derived.ok ? [] : derived.faults;
}

function placed(faults: ReturnType<typeof faultsOf>, values: Values & { readonly way: MaterialWay }) {
  const byField: Record<string, string> = {};
  const rest: string[] = [];
  for (const { pointer, message } of faults) {
    const name = placeFault(pointer, sectionsOf(values.way), values);
    if (name !== null && byField[name] === undefined) byField[name] = message;
    else rest.push(message);
  }
  return { byField: byField as FieldErrors<Values>, rest };
}
