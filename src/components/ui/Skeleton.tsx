interface SkeletonProps {
  /** What is being waited for, read out once. */
  label: string;
  lines?: number;
}

/** Holds the place of what is on its way. */
export function Skeleton({ label, lines = 3 }: SkeletonProps) {
  return (
    <div role="status" className="space-y-3">
      <span className="sr-only">{label}</span>
      {Array.from({ length: lines }, (_, index) => (
        <div
          key={index}
          aria-hidden
          className="h-4 animate-pulse rounded-fine bg-line forced-colors:border"
          style={{ width: `${92 - ((index * 23) % 41)}%` }}
        />
      ))}
    </div>
  );
}
