import { LOAD_BAND_EDGES } from '@embertally/shared/tally/density-band';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { useBook } from '../session/use-book.ts';

/** What the shading of rooms means: bands of fire load density, pale to deep, with their hatch. */
export function LoadLegend() {
  const units = useBook((state) => state.units);
  const edges = LOAD_BAND_EDGES.map((edge) => ({ edge, ...formatQuantity(edge, 'MJ/m2', units) }));
  return (
    <figure className="load-legend">
      <figcaption>
        Load density <span className="font-normal text-soft">{edges[0]?.unit}</span>
      </figcaption>
      <ol aria-label="Each band begins at">
        {edges.map(({ edge, text }, band) => (
          <li key={edge}>
            <span className="load-swatch" data-band={band} aria-hidden="true" />
            <span>{text}</span>
          </li>
        ))}
      </ol>
    </figure>
  );
}
