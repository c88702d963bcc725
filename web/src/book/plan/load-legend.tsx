import { LOAD_BAND_EDGES } from '@embertally/shared/tally/density-band';

/** What the shading of rooms means: bands of fire load density, pale to deep, with their hatch. */
export function LoadLegend() {
  return (
    <figure className="load-legend">
      <figcaption>
        Load density <span className="font-normal text-soft">MJ/m²</span>
      </figcaption>
      <ol aria-label="Each band begins at">
        {LOAD_BAND_EDGES.map((edge, band) => (
          <li key={edge}>
            <span className="load-swatch" data-band={band} aria-hidden="true" />
            <span className="figure">{edge}</span>
          </li>
        ))}
      </ol>
    </figure>
  );
}
