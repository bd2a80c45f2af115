interface SkeletonProps {
  /** `cards` for a list, `sheet` for a drawing, `lines` for anything else. */
  readonly shape?: 'lines' | 'cards' | 'sheet';
}

const places = ['a', 'b', 'c', 'd', 'e', 'f'];

/** The construction lines of a page whose content is on its way. */
export function Skeleton({ shape = 'lines' }: SkeletonProps) {
  return (
    <div role="status" className="animate-pulse">
      <span className="sr-only">Loading</span>
      {shape === 'lines' && (
        <div className="max-w-2xl space-y-4">
          {places.slice(0, 4).map((place) => (
            <div key={place} className="h-6 border-b border-dashed border-ink-soft" />
          ))}
        </div>
      )}
      {shape === 'cards' && (
        <div className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,19rem),1fr))] gap-6">
          {places.map((place) => (
            <div key={place} className="h-90 border border-dashed border-ink-soft" />
          ))}
        </div>
      )}
      {shape === 'sheet' && <div className="h-120 border border-dashed border-ink-soft" />}
    </div>
  );
}
