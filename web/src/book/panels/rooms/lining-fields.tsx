import { liningByKey, LININGS } from '@embertally/shared/catalogue/linings';
import type { Done, Refusal } from '@embertally/shared/survey/command';
import type { Lining, LiningLayer, LiningSurface } from '@embertally/shared/survey/survey-document';
import { Fragment } from 'react';
import { CommandChoice } from '../command-choice.tsx';
import { FIRST_LAYER, LayerFields } from './layer-fields.tsx';

const SURFACES = [
  { name: 'walls', label: 'Walls' },
  { name: 'ceiling', label: 'Ceiling' },
  { name: 'floor', label: 'Floor' },
] as const;
const UNKNOWN = '';
const OWN = 'own layers';

interface LiningFieldsProps {
  readonly lining: Lining;
  readonly run: (lining: Lining) => Done | Refusal;
}

const valueOf = (surface: LiningSurface | null): string =>
  surface === null ? UNKNOWN : 'key' in surface ? surface.key : OWN;

/** Layers to begin with: those of the catalogue's row that was chosen before. */
function layersOf(surface: LiningSurface | null): LiningLayer[] {
  if (surface === null) return [FIRST_LAYER];
  if ('layers' in surface) return surface.layers;
  return [...(liningByKey(surface.key)?.layers ?? [FIRST_LAYER])];
}

/** What walls, ceiling and floor are made of, from the catalogue or layer by layer. */
export function LiningFields({ lining, run }: LiningFieldsProps) {
  return (
    <>
      {SURFACES.map(({ name, label }) => {
        const surface = lining[name];
        const set = (next: LiningSurface | null) => run({ ...lining, [name]: next });
        return (
          <Fragment key={name}>
            <CommandChoice
              label={`Lining of the ${label.toLowerCase()}`}
              value={valueOf(surface)}
              options={[
                { value: UNKNOWN, label: 'Not known' },
                ...LININGS.map((row) => ({ value: row.key, label: row.label })),
                { value: OWN, label: 'Layers of its own' },
              ]}
              run={(key) => set(key === UNKNOWN ? null : key === OWN ? { layers: layersOf(surface) } : { key })}
            />
            {surface !== null && 'layers' in surface && (
              <LayerFields surface={label.toLowerCase()} layers={surface.layers} run={(layers) => set({ layers })} />
            )}
          </Fragment>
        );
      })}
    </>
  );
}
