import { useMemo } from 'react';
import type { Done, Refusal } from '@embertally/shared/survey/command';
import { entriesOfRoom } from '@embertally/shared/survey/derive/entries-of-room';
import { assumptionsOrNone, NO_ASSUMPTIONS } from '@embertally/shared/survey/no-assumptions';
import type { Assumptions, Room } from '@embertally/shared/survey/survey-document';
import { useBook } from '../../session/use-book.ts';
import { CommandChoice } from '../command-choice.tsx';
import { CommandQuantity } from '../command-quantity.tsx';
import { CommandText } from '../command-text.tsx';

interface AssumptionFieldsProps {
  readonly room: Room;
  readonly run: (assumptions: Assumptions | null) => Done | Refusal;
}

const DEFAULT = '';
const GROWTH = [
  { value: DEFAULT, label: 'From contents and use' },
  { value: 'slow', label: 'Slow' },
  { value: 'medium', label: 'Medium' },
  { value: 'fast', label: 'Fast' },
  { value: 'ultra-fast', label: 'Ultra-fast' },
] as const;
const BASIS = [
  { value: DEFAULT, label: 'What was found' },
  { value: 'mean', label: 'An average day: raised to the 80 % value' },
  { value: 'peak_stock', label: 'The agreed maximum of stock' },
] as const;
const CONVENTION = [
  { value: DEFAULT, label: '1000 kW at the growth time (EN)' },
  { value: 'NFPA', label: '1055 kW at the growth time' },
] as const;
const PROTECTED = [
  { value: DEFAULT, label: '0.85 of what closed metal cabinets hold' },
  { value: 'EN', label: 'EN 10 % rule' },
] as const;
const MEMBER = [
  { value: DEFAULT, label: 'Protected steel or concrete' },
  { value: 'unprotected_steel', label: 'Unprotected steel' },
  { value: 'timber', label: 'Timber' },
  { value: 'composite', label: 'Composite' },
] as const;
const TABLE = [
  { value: DEFAULT, label: 'EN 1991-1-2' },
  { value: 'UK', label: 'United Kingdom annex' },
] as const;

/** What the tally is to take for the room in place of its defaults. */
export function AssumptionFields({ room, run }: AssumptionFieldsProps) {
  const document = useBook((state) => state.document);
  const entries = useMemo(() => entriesOfRoom(document, room.id), [document, room.id]);
  const current = room.assumptions ?? NO_ASSUMPTIONS;
  const set = (patch: Partial<Assumptions>) => run(assumptionsOrNone({ ...current, ...patch }));
  const firstGone = current.first_entry !== null && !entries.some((entry) => entry.id === current.first_entry);
  return (
    <>
      <CommandChoice
        label="Growth of the fire"
        value={current.growth ?? DEFAULT}
        options={GROWTH}
        run={(growth) => set({ growth: growth === DEFAULT ? null : growth })}
      />
      <CommandQuantity
        label="Rate per burning area"
        hint="Left empty: as tables have it for the use, or from the contents."
        unit="kW/m2"
        value={current.plateau_kW_m2}
        optional
        minimum={1}
        maximum={100_000}
        run={(plateau_kW_m2) => set({ plateau_kW_m2 })}
      />
      <CommandQuantity
        label="Area that burns at once"
        hint="Left empty: the floor, or the contents of a fire that stays local."
        unit="m2"
        value={current.fire_area_m2}
        optional
        minimum={0.01}
        maximum={1_000_000}
        run={(fire_area_m2) => set({ fire_area_m2 })}
      />
      <CommandChoice
        label="Fire begins at"
        value={current.first_entry !== null && !firstGone ? current.first_entry : DEFAULT}
        options={[
          { value: DEFAULT, label: 'The worst place, which is sought' },
          ...entries.map(({ id, label }) => ({ value: id, label })),
        ]}
        run={(id) => set({ first_entry: id === DEFAULT ? null : id })}
      />
      <CommandChoice
        label="The surveyed amount is"
        value={current.load_basis === 'as_surveyed' ? DEFAULT : (current.load_basis ?? DEFAULT)}
        options={BASIS}
        run={(basis) => set({ load_basis: basis === DEFAULT ? null : basis })}
      />
      <CommandChoice
        label="Closed cabinets"
        value={current.protected_loads === 'EN' ? 'EN' : DEFAULT}
        options={PROTECTED}
        run={(rule) => set({ protected_loads: rule === DEFAULT ? null : rule })}
      />
      {current.protected_loads === 'EN' && (
        <CommandText
          label="Why the EN rule holds here"
          hint="It holds only where the rest cannot be heated to ignition. Your note stands with the result."
          value={current.protected_loads_note}
          run={(protected_loads_note) => set({ protected_loads_note })}
        />
      )}
      <CommandQuantity
        label="Combustion factor m"
        hint="Left empty: 0.8 for wood, paper and cotton, 1 for the rest."
        unit=""
        value={current.combustion_factor}
        optional
        minimum={0.01}
        maximum={1}
        run={(combustion_factor) => set({ combustion_factor })}
      />
      <CommandChoice
        label="Growth times mean"
        value={current.growth_convention === 'NFPA' ? 'NFPA' : DEFAULT}
        options={CONVENTION}
        run={(convention) => set({ growth_convention: convention === DEFAULT ? null : convention })}
      />
      <CommandChoice
        label="Structure to be compared"
        value={typeof current.kc === 'string' ? current.kc : DEFAULT}
        options={MEMBER}
        run={(kc) => set({ kc: kc === DEFAULT ? null : kc })}
      />
      <CommandChoice
        label="Table for the linings"
        value={current.kb === 'UK' ? 'UK' : DEFAULT}
        options={TABLE}
        run={(kb) => set({ kb: kb === DEFAULT ? null : kb })}
      />
      <CommandQuantity
        label="Heated for, at flashover"
        hint="Left empty: 600 s."
        unit="s"
        value={current.exposure_s}
        optional
        minimum={1}
        maximum={86_400}
        run={(exposure_s) => set({ exposure_s })}
      />
      <CommandQuantity
        label="Air temperature before"
        hint="Left empty: 20 °C."
        unit="°C"
        value={current.ambient_C}
        optional
        minimum={-50}
        maximum={60}
        run={(ambient_C) => set({ ambient_C })}
      />
    </>
  );
}
