import type { DrawingSummary } from '#shared/api/drawings.ts';
import { Findings } from '../../components/Findings.tsx';

const place = (line: number | undefined, column: number | undefined): string | undefined => {
  if (line === undefined) return undefined;
  return column === undefined ? `line ${line}` : `line ${line}, column ${column}`;
};

/** What was found while the file was read; with their places in it. */
export function DrawingNotes({ warnings }: Pick<DrawingSummary, 'warnings'>) {
  if (warnings.length === 0) return null;
  return (
    <section aria-labelledby="notes-head">
      <h2 id="notes-head" className="label-narrow mb-2 text-ink-soft">
        Notes on the drawing
      </h2>
      <Findings
        label="Notes on the drawing"
        findings={warnings.map(({ message, line, column }) => ({
          level: 'caution',
          sentence: message,
          figures: place(line, column),
        }))}
      />
    </section>
  );
}
