type SkeletonProps = {
  /** Read aloud and shown small: what is being fetched. */
  label: string;
  rows?: number;
};

/** Unlit tape where rows will stand, while they are being fetched. */
export function Skeleton({ label, rows = 3 }: SkeletonProps) {
  return (
    <div role="status" className="py-2">
      <p className="mb-2 text-base text-soft">{label}</p>
      <div aria-hidden="true" className="flex flex-col gap-2 animate-pulse">
        {Array.from({ length: rows }, (_, row) => (
          <div key={row} className="unlit h-11 border-hair border-rule" />
        ))}
      </div>
    </div>
  );
}
