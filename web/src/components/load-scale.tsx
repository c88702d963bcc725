/** Where the bands of fire load density begin, MJ/m². */
const FROM = [0, 200, 450, 700, 1000, 1400] as const;
const FILLS = ['fill-load-0', 'fill-load-1', 'fill-load-2', 'fill-load-3', 'fill-load-4', 'fill-load-5'] as const;
/** Distance between the strokes of the hatch: denser with every band, so that colour never speaks alone. */
const PITCH = [0, 18, 13, 9, 6, 4] as const;

/** The bands a room is shaded and hatched by, from little to much. A picture; the words beside it say the same. */
export function LoadScale() {
  return (
    <svg viewBox="0 0 480 74" className="w-full max-w-[30rem]" aria-hidden="true">
      <defs>
        {PITCH.map((pitch, band) =>
          pitch === 0 ? null : (
            <pattern
              key={pitch}
              id={`scale-hatch-${band}`}
              width={pitch}
              height={pitch}
              patternUnits="userSpaceOnUse"
              patternTransform="rotate(45)"
            >
              <path
                d={`M0 0V${pitch}`}
                className={band >= 4 ? 'stroke-white/40' : 'stroke-black/25'}
                strokeWidth="1.4"
              />
            </pattern>
          ),
        )}
      </defs>
      {FROM.map((from, band) => (
        <g key={from}>
          <rect x={band * 80 + 1} y="1" width="78" height="44" className={FILLS[band]} />
          <rect
            x={band * 80 + 1}
            y="1"
            width="78"
            height="44"
            fill={band === 0 ? 'none' : `url(#scale-hatch-${band})`}
          />
          <rect x={band * 80 + 1} y="1" width="78" height="44" fill="none" className="stroke-ink" strokeWidth="1" />
          <text x={band * 80 + 1} y="66" className="figure fill-soft text-[15px]">
            {from}
          </text>
        </g>
      ))}
    </svg>
  );
}
