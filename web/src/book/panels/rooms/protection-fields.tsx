import type { Done, Refusal } from '@embertally/shared/survey/command';
import type { Protection } from '@embertally/shared/survey/survey-document';
import { CommandChoice } from '../command-choice.tsx';
import { CommandQuantity } from '../command-quantity.tsx';

interface ProtectionFieldsProps {
  readonly protection: Protection;
  readonly run: (protection: Protection) => Done | Refusal;
}

/** An ordinary sprinkler: fast enough to be common, set to answer at 68 °C, half a 3.5 m grid's diagonal away. */
const FIRST_SPRINKLER: NonNullable<Protection['sprinklers']> = { rti: 50, activation_C: 68, distance_m: 2.5 };

const YES_NO = [
  { value: 'unknown', label: 'Not known' },
  { value: 'yes', label: 'Yes' },
  { value: 'no', label: 'No' },
  { value: 'not-applicable', label: 'Does not apply' },
] as const;

/** What protects the room. "Not known" earns no credit anywhere. */
export function ProtectionFields({ protection, run }: ProtectionFieldsProps) {
  const { sprinklers } = protection;
  const set = (patch: Partial<Protection>) => run({ ...protection, ...patch });
  return (
    <>
      <CommandChoice
        label="Sprinklers"
        value={sprinklers === null ? 'no' : 'yes'}
        options={[
          { value: 'no', label: 'None, or not known' },
          { value: 'yes', label: 'In service, to their standard' },
        ]}
        run={(answer) => set({ sprinklers: answer === 'yes' ? FIRST_SPRINKLER : null })}
      />
      {sprinklers !== null && (
        <>
          <CommandQuantity
            label="Response time index"
            hint="From the sprinkler’s data sheet: fast 50 (m·s)^½ or less, standard 80 to 350."
            unit="(m s)1/2"
            value={sprinklers.rti}
            minimum={1}
            maximum={1000}
            run={(rti) => set({ sprinklers: { ...sprinklers, rti } })}
          />
          <CommandQuantity
            label="Sprinkler temperature"
            unit="°C"
            value={sprinklers.activation_C}
            minimum={30}
            maximum={400}
            run={(activation_C) => set({ sprinklers: { ...sprinklers, activation_C } })}
          />
          <CommandQuantity
            label="Sprinkler distance"
            unit="m"
            value={sprinklers.distance_m}
            minimum={0.01}
            maximum={50}
            run={(distance_m) => set({ sprinklers: { ...sprinklers, distance_m } })}
          />
          <CommandChoice
            label="Independent water supplies"
            value={String(protection.independent_water_supplies ?? 'unknown')}
            options={[
              { value: 'unknown', label: 'Not known' },
              { value: '0', label: 'None' },
              { value: '1', label: 'One' },
              { value: '2', label: 'Two' },
            ]}
            run={(count) => set({ independent_water_supplies: count === 'unknown' ? null : Number(count) })}
          />
        </>
      )}
      <CommandChoice
        label="Detection"
        value={protection.detection}
        options={[
          { value: 'unknown', label: 'Not known' },
          { value: 'none', label: 'None' },
          { value: 'heat', label: 'Heat' },
          { value: 'smoke', label: 'Smoke' },
          { value: 'both', label: 'Heat and smoke' },
        ]}
        run={(detection) => set({ detection })}
      />
      <CommandChoice
        label="Alarm goes to the brigade by itself"
        value={protection.alarm_to_brigade === null ? 'unknown' : protection.alarm_to_brigade ? 'yes' : 'no'}
        options={YES_NO.slice(0, 3)}
        run={(answer) => set({ alarm_to_brigade: answer === 'unknown' ? null : answer === 'yes' })}
      />
      <CommandChoice
        label="Fire brigade"
        value={protection.brigade}
        options={[
          { value: 'unknown', label: 'Not known' },
          { value: 'none', label: 'None' },
          { value: 'works', label: 'Works brigade' },
          { value: 'off-site', label: 'Off-site brigade' },
          { value: 'both', label: 'Works and off-site' },
        ]}
        run={(brigade) => set({ brigade })}
      />
      <CommandChoice
        label="Access routes"
        value={protection.access_routes}
        options={[
          { value: 'unknown', label: 'Not known' },
          { value: 'normal', label: 'Normal' },
          { value: 'pressurised', label: 'Stairs pressurised on alarm' },
          { value: 'missing', label: 'Missing' },
        ]}
        run={(access_routes) => set({ access_routes })}
      />
      <CommandChoice
        label="Fire-fighting devices"
        value={protection.firefighting_devices}
        options={YES_NO}
        run={(firefighting_devices) => set({ firefighting_devices })}
      />
      <CommandChoice
        label="Smoke exhaust in staircases"
        value={protection.stair_smoke_exhaust}
        options={YES_NO}
        run={(stair_smoke_exhaust) => set({ stair_smoke_exhaust })}
      />
    </>
  );
}
