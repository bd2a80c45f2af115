import type { Finding } from '#shared/api/findings.ts';
import { FindingFigures } from '../review/FindingFigures.tsx';

/** What the rules say of the settings as they stand in the form, before they are published. */
export function SettingsFindings({ findings }: { readonly findings: readonly Finding[] }) {
  if (findings.length === 0) return null;
  const isStopped = findings.some(({ level }) => level === 'do-not-cut');
  return (
    <section aria-labelledby="findings-head" aria-live="polite" className="space-y-4">
      <h3 id="findings-head" className="text-base leading-6">
        What the rules say of these settings
      </h3>
      {isStopped && (
        <p className="border-2 border-brick bg-paper p-4">
          <strong className="text-brick">These settings will wait for a moderator.</strong> Until one has
          decided they are not handed out; the drawing is. You can change them, publish them to wait, or
          publish the drawing without them.
        </p>
      )}
      {findings.map((finding) => (
        <FindingFigures key={`${finding.ruleId} ${finding.sentence}`} finding={finding} headingLevel="h4" />
      ))}
    </section>
  );
}
