interface SkeletonProps {
  /** What is being read: "Reading your sites". */
  readonly label: string;
  readonly lines?: number;
}

const LENGTHS = ['w-2/5', 'w-3/5', 'w-1/3', 'w-1/2', 'w-2/3'] as const;

/** The ruled lines of a page whose figures are still coming. Does not move. */
export function Skeleton({ label, lines = 5 }: SkeletonProps) {
  return (
    <div role="status">
      <p className="unseen">{label}</p>
      <div aria-hidden="true">
        {Array.from({ length: lines }, (_, line) => (
          <div key={line} className="flex h-12 items-center border-b border-rule">
            <div className={`h-2.5 bg-tab ${LENGTHS[line % LENGTHS.length] ?? ''}`} />
          </div>
        ))}
      </div>
    </div>
  );
}
