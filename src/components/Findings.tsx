type FindingLevel = 'note' | 'caution' | 'doNotCut';

interface Finding {
  readonly level: FindingLevel;
  readonly sentence: string;
  /** The numbers the sentence rests on, and where it speaks of: `line 12, column 4`. */
  readonly figures?: string | undefined;
  readonly source?: string | undefined;
}

const words: Readonly<Record<FindingLevel, { readonly word: string; readonly ink: string }>> = {
  note: { word: 'note', ink: 'text-ink-soft' },
  caution: { word: 'caution', ink: 'text-ochre-ink' },
  doNotCut: { word: 'do not cut', ink: 'text-brick' },
};

/** Notes on a drawing: numbered as their balloons are. */
export function Findings({
  findings,
  label,
  columns = 2,
}: {
  readonly findings: readonly Finding[];
  readonly label: string;
  /** Side by side where the whole page is theirs; one below the other in a column. */
  readonly columns?: 1 | 2;
}) {
  return (
    <ol aria-label={label} className={`grid gap-x-8 gap-y-3 ${columns === 2 ? 'lg:grid-cols-2' : ''}`}>
      {findings.map(({ level, sentence, figures, source }, index) => (
        <li key={`${level} ${sentence} ${figures ?? ''}`} className="flex gap-3">
          <span
            aria-hidden="true"
            className={`figures grid size-6 shrink-0 place-items-center rounded-full border-2 border-current text-xs font-bold ${words[level].ink}`}
          >
            {index + 1}
          </span>
          <span className="min-w-0">
            <strong className={`figures text-sm ${words[level].ink}`}>{words[level].word}</strong> {sentence}
            {(figures !== undefined || source !== undefined) && (
              <span className="figures block text-xs leading-5 text-ink-soft">
                {[figures, source].filter((part) => part !== undefined).join(' · ')}
              </span>
            )}
          </span>
        </li>
      ))}
    </ol>
  );
}
