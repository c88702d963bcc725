interface MarkProps {
  /** Edge in CSS pixels. */
  readonly size?: number;
  readonly className?: string;
}

/** The mark: a tally of five, four upright strokes in ink and the slanted fifth in madder. Always beside the name. */
export function Mark({ size = 28, className }: MarkProps) {
  return (
    <svg viewBox="0 0 32 26" width={(size * 32) / 26} height={size} aria-hidden="true" className={className}>
      <g fill="none" strokeLinecap="round" strokeWidth="2.6">
        <path className="stroke-ink" d="M8 3v20M13.3 3v20M18.7 3v20M24 3v20" />
        <path className="stroke-madder" d="M3.5 19.5 28.5 6.5" />
      </g>
    </svg>
  );
}
