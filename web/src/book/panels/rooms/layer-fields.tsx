import type { Done, Refusal } from '@embertally/shared/survey/command';
import type { LiningLayer } from '@embertally/shared/survey/survey-document';
import { Button } from '../../../components/button.tsx';
import { CommandQuantity } from '../command-quantity.tsx';

/** The schema of a surface takes no more. */
const MOST = 8;

/** Ordinary concrete, EN 1992-1-2 rounded (from memory): something to change, never to be taken for an answer. */
export const FIRST_LAYER: LiningLayer = {
  thickness_m: 0.1,
  conductivity_W_mK: 1.6,
  density_kg_m3: 2300,
  specific_heat_J_kgK: 1000,
};

interface LayerFieldsProps {
  readonly surface: string;
  readonly layers: readonly LiningLayer[];
  readonly run: (layers: LiningLayer[]) => Done | Refusal;
}

/** The layers of one surface, exposed side first, each with what heat conduction needs. */
export function LayerFields({ surface, layers, run }: LayerFieldsProps) {
  const change = (index: number, patch: Partial<LiningLayer>) =>
    run(layers.map((layer, at) => (at === index ? { ...layer, ...patch } : layer)));
  return (
    <fieldset className="layers col-span-full">
      <legend>Layers of the {surface}, exposed side first</legend>
      <ol className="grid gap-3">
        {layers.map((layer, index) => (
          <li key={index} className="layer">
            <CommandQuantity
              label="Thickness"
              unit="mm"
              value={layer.thickness_m * 1000}
              minimum={0.1}
              maximum={10_000}
              run={(mm) => change(index, { thickness_m: mm / 1000 })}
            />
            <CommandQuantity
              label="Conductivity"
              unit="W/mK"
              value={layer.conductivity_W_mK}
              minimum={0.001}
              maximum={1000}
              run={(conductivity_W_mK) => change(index, { conductivity_W_mK })}
            />
            <CommandQuantity
              label="Density"
              unit="kg/m3"
              value={layer.density_kg_m3}
              minimum={1}
              maximum={25_000}
              run={(density_kg_m3) => change(index, { density_kg_m3 })}
            />
            <CommandQuantity
              label="Specific heat"
              unit="J/kgK"
              value={layer.specific_heat_J_kgK}
              minimum={1}
              maximum={20_000}
              run={(specific_heat_J_kgK) => change(index, { specific_heat_J_kgK })}
            />
            {layers.length > 1 && (
              <Button
                look="quiet"
                className="justify-self-start"
                onClick={() => {
                  run(layers.filter((_, at) => at !== index));
                }}
              >
                Take layer {index + 1} away
              </Button>
            )}
          </li>
        ))}
      </ol>
      {layers.length < MOST && (
        <Button
          look="quiet"
          onClick={() => {
            run([...layers, layers.at(-1) ?? FIRST_LAYER]);
          }}
        >
          Add a layer behind
        </Button>
      )}
    </fieldset>
  );
}
