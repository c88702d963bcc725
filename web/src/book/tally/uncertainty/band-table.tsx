import type { RoomUncertainty } from '@embertally/shared/uncertainty/room-uncertainty';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { UnitText } from '../../../components/working/unit-text.tsx';
import { useUnits } from '../../../lib/units-context.ts';
import { Figure } from '../figure.tsx';

const ROWS = [
  ['perFloor', 'Fire load density'],
  ['total', 'Heat kept in this room'],
  ['peak', 'Peak heat release'],
  ['equivalentTime', 'Equivalent time, as kept'],
] as const;
const PLACES = [
  ['p5', '5 %'],
  ['p50', 'Middle'],
  ['p80', '80 %'],
  ['p95', '95 %'],
] as const;

/** The bands side by side: in so many percent of the samples the number is lower. */
export function BandTable({ bands }: { readonly bands: RoomUncertainty['bands'] }) {
  const units = useUnits();
  return (
    <table className="tally-ledger w-full text-small">
      <caption className="unseen">How sure each number is: in so many percent of the samples it is lower</caption>
      <thead>
        <tr>
          <th scope="col">Lower in</th>
          {PLACES.map(([key, label]) => (
            <th key={key} scope="col" data-align="end">
              {label}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {ROWS.map(([key, label]) => {
          const band = bands[key];
          if (band === undefined) return null;
          return (
            <tr key={key}>
              <th scope="row">
                {label},{' '}
                <span className="whitespace-nowrap text-soft">
                  <UnitText unit={displayUnit(band.p5.unit, units)?.symbol ?? band.p5.unit} />
                </span>
              </th>
              {PLACES.map(([place]) => (
                <td key={place} data-align="end">
                  <Figure path={`uncertainty.bands.${key}.${place}`} estimate={band[place]} unit="bare" />
                </td>
              ))}
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
