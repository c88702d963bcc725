import type { ReactNode } from 'react';
import { Page } from '../../components/page.tsx';
import { Part } from '../../components/part.tsx';
import { Quantity } from '../../components/quantity.tsx';
import { Range } from '../../components/range.tsx';
import type { TrailStep } from '../../components/trail.tsx';
import type { CatalogueMaterial } from '../../lib/catalogue-materials.ts';

const IGNITION: Readonly<Record<CatalogueMaterial['ignition_class'], string>> = {
  easy: 'Easily',
  normal: 'Normally',
  hard: 'Hardly',
  resistant: 'Only in a strong fire',
};

interface BuiltInViewProps {
  readonly material: CatalogueMaterial;
  readonly trail: readonly TrailStep[];
}

/** A built-in material: its figures and where they come from. */
export function BuiltInView({ material, trail }: BuiltInViewProps) {
  const { source, bulk_density_kg_m3: density } = material;
  const share = (value: number | null): string | null =>
    value === null ? null : `${String(Number(value.toPrecision(3)))} kg/kg burnt`;
  const facts: readonly (readonly [string, ReactNode | null])[] = [
    ['Low – high', <Range key="range" low={material.low_MJ_kg} high={material.high_MJ_kg} unit="MJ/kg" />],
    [
      'Gross heat',
      material.gross_heat_MJ_kg === null ? null : (
        <Quantity key="gross" value={material.gross_heat_MJ_kg} unit="MJ/kg" />
      ),
    ],
    ['Formula', material.formula],
    ['Combustion factor', material.cellulosic ? '0.8, mainly cellulosic' : '1'],
    ['Takes fire', IGNITION[material.ignition_class]],
    ['Radiates', `${String(Number((100 * material.radiative_fraction).toPrecision(3)))} % of its heat`],
    ['Soot', share(material.soot_yield)],
    ['Carbon monoxide', share(material.co_yield)],
    ['Kept in bulk', density === null ? null : <Quantity key="density" value={density.typical} unit="kg/m3" />],
    [
      'In bulk, low – high',
      density === null ? null : <Range key="bulk" low={density.low} high={density.high} unit="kg/m3" />,
    ],
    ['Water, of the dry mass', material.moisture_pct_dry === null ? null : `${material.moisture_pct_dry} %`],
    ['To know before touching it', material.hazards.length === 0 ? null : material.hazards.join(', ')],
    ['Also called', material.synonyms.length === 0 ? null : material.synonyms.join(', ')],
  ];
  return (
    <Page title={material.label} lead={`Built in · ${material.group}`} trail={trail}>
      <Part title="Heat">
        <p className="pt-4 text-soft">Net heat, as usually found</p>
        <p className="mb-3 text-display">
          <Quantity value={material.net_heat_MJ_kg} unit="MJ/kg" />
        </p>
        <dl className="max-w-[44rem]">
          {facts
            .filter(([, value]) => value !== null)
            .map(([name, value]) => (
              <div
                key={name}
                className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-rule py-1.5"
              >
                <dt className="text-soft">{name}</dt>
                <dd className="text-right">{value}</dd>
              </div>
            ))}
        </dl>
      </Part>
      <Part title="Where it comes from">
        <p className="max-w-[68ch] pt-4">
          {source.title}; {source.locator}
          {source.fromMemory ? (
            <span className="text-soft"> – taken from memory of the source, to be read again</span>
          ) : null}
        </p>
        <p className="max-w-[68ch] pt-2 text-soft">
          Built-in figures change only with the program. For goods you know better, add a material of your own.
        </p>
      </Part>
    </Page>
  );
}
