import type { DerivedMaterial } from '@embertally/shared/materials/derived-material';
import type { ReactNode } from 'react';
import { Quantity } from '../../components/quantity.tsx';
import { Range } from '../../components/range.tsx';

/** The heat of a material with its range and what it rests on, and what else follows from what was stated. */
export function HeatFigures({ derived }: { readonly derived: DerivedMaterial }) {
  const { basis, gross_MJ_kg, oxygen_kg_kg, moisture_pct_wet } = derived;
  const facts: readonly (readonly [string, ReactNode])[] = [
    ['Low – high', <Range key="range" low={derived.low_MJ_kg} high={derived.high_MJ_kg} unit="MJ/kg" />],
    ['Range from', derived.range_basis],
    ...(gross_MJ_kg === null
      ? []
      : [['Gross heat', <Quantity key="gross" value={gross_MJ_kg} unit="MJ/kg" />] as const]),
    ...(oxygen_kg_kg === null
      ? []
      : [['Oxygen it takes up', <Quantity key="oxygen" value={oxygen_kg_kg} unit="kg/kg" />] as const]),
    ...(basis === null || basis.perOxygen_MJ_kg === null
      ? []
      : [['Heat per kg of oxygen', <Quantity key="per" value={basis.perOxygen_MJ_kg} unit="MJ/kg" />] as const]),
    ...(moisture_pct_wet === null ? [] : [['Water, of the wet mass', `${round(moisture_pct_wet)} %`] as const]),
    ['Combustion factor', derived.combustion_factor === 0.8 ? '0.8, mainly cellulosic' : '1'],
    ['Radiates', `${round(100 * derived.radiative_fraction)} % of its heat`],
  ];
  return (
    <>
      <p className="text-soft">Net heat, as received</p>
      <p className="mb-3 text-display">
        <Quantity value={derived.net_MJ_kg} unit="MJ/kg" />
      </p>
      <dl>
        {facts.map(([name, value]) => (
          <div key={name} className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-rule py-1.5">
            <dt className="text-soft">{name}</dt>
            <dd className="text-right">{value}</dd>
          </div>
        ))}
      </dl>
    </>
  );
}

const round = (value: number): string => String(Number(value.toPrecision(3)));
