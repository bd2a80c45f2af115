import type { CutRecord } from '#shared/api/cuts.ts';
import type { Design } from '#shared/api/designs.ts';
import { Tally } from '../../components/Tally.tsx';

interface SettingsStandingProps {
  readonly record: CutRecord;
  readonly settingsStanding: Design['settingsStanding'];
}

/** How far these settings are proven: the same count, over the records that were cut with them. */
export function SettingsStanding({ record, settingsStanding }: SettingsStandingProps) {
  const standing = settingsStanding.find(({ recordId }) => recordId === record.id);
  if (standing === undefined || record.materialFamily === null) return null;
  return (
    <div className="mt-3">
      <h3 className="label-narrow mb-1 text-ink-soft">These settings, one stroke a member</h3>
      <Tally standing={{ ...standing, material: record.materialFamily }} withInterval />
      <p className="text-sm leading-5 text-ink-soft">
        Counted over records with the same bit, and chip load and depth within 15 %.
      </p>
    </div>
  );
}
