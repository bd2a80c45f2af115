interface ChainStateProps {
  readonly isWhole: boolean;
  readonly total: number;
}

/** Whether anything in the log was changed or taken out after it was written. */
export function ChainState({ isWhole, total }: ChainStateProps) {
  const entries = total === 1 ? '1 entry' : `${total} entries`;
  return (
    <p
      role={isWhole ? 'status' : 'alert'}
      className={`border-2 bg-paper p-4 ${isWhole ? 'border-pine' : 'border-brick'}`}
    >
      {isWhole ? (
        <>
          <strong className="text-pine">The chain is whole.</strong> {entries}; each carries the hash of the
          one before it, and all of them agree.
        </>
      ) : (
        <>
          <strong className="text-brick">The chain is broken.</strong> An entry among the {entries} was
          changed or taken out after it was written. Tell your administrator: <code>npm run doctor</code> says
          where.
        </>
      )}
    </p>
  );
}
