import type { CutRecord } from '#shared/api/cuts.ts';
import type { Design } from '#shared/api/designs.ts';
import { Findings } from '../../components/Findings.tsx';
import { SelectField } from '../../components/SelectField.tsx';
import { materialLabels, outcomeLabels } from '../../words/labels.ts';
import { sayDay } from '../../words/say-day.ts';
import type { Evidence } from './evidence.ts';
import { findingsShown } from './records/findings-shown.ts';
import { SettingsStanding } from './SettingsStanding.tsx';
import { SettingsTable } from './SettingsTable.tsx';

interface SettingsPanelProps {
  readonly evidence: Evidence;
  readonly record: CutRecord | null;
  readonly settingsStanding: Design['settingsStanding'];
  readonly onChoose: (recordId: string | null) => void;
}

const lineOf = ({ member, createdAt, materialId, outcome, machine }: CutRecord): string =>
  `${member.name}, ${sayDay(createdAt)}: ${materialLabels[materialId]}, ${outcomeLabels[outcome].toLowerCase()}, ${machine.name}`;

const noRecord = ({ ofThis, ofOthers }: Evidence): string => {
  if (ofThis.length > 0)
    return 'No recorded cut came out clean, so no settings are put forward. Choose a record to see what was tried.';
  if (ofOthers.length > 0) return 'Not cut yet: nobody has recorded a cut of this revision.';
  return 'Not cut yet: nobody has recorded a cut.';
};

/** The settings that were shared, one record at a time, or plainly that there are none. */
export function SettingsPanel({ evidence, record, settingsStanding, onChoose }: SettingsPanelProps) {
  const { ofThis, ofOthers } = evidence;
  const hasChoice = ofThis.length > 1 || (ofThis.length === 1 && record === null);
  return (
    <section aria-labelledby="settings-head">
      <h2 id="settings-head" className="label-narrow mb-2 text-ink-soft">
        {record === null
          ? 'Settings'
          : `Settings from ${record.member.name}’s record, ${sayDay(record.createdAt)}`}
      </h2>
      {record === null && <p className="mb-3 text-lg leading-7 font-semibold">{noRecord(evidence)}</p>}
      {hasChoice && (
        <div className="mb-3">
          <SelectField
            label="Record"
            value={record?.id ?? ''}
            onChange={(event) => onChoose(event.target.value === '' ? null : event.target.value)}
            options={ofThis.map((cut) => ({ value: cut.id, label: lineOf(cut) }))}
            {...(record === null ? { placeholder: 'Choose a record' } : {})}
          />
        </div>
      )}
      {record?.outcome === 'failed' && (
        <p className="mb-3 border-2 border-brick bg-paper p-3 font-semibold text-brick">
          <span aria-hidden="true">✕ </span>This cut failed. Its settings are shown so that nobody repeats
          them.
        </p>
      )}
      {record?.settingsWithheld !== undefined && (
        <p className="mb-3 border-2 border-brick bg-paper p-3">
          <strong className="text-brick">These settings are withheld.</strong>{' '}
          {record.settingsWithheld.reason}
        </p>
      )}
      {record !== null && record.findings.length > 0 && (
        <div className="mb-3">
          <Findings
            label="Findings on these settings"
            findings={findingsShown(record.findings)}
            columns={1}
          />
        </div>
      )}
      {record !== null && record.settingsWithheld === undefined && <SettingsTable record={record} />}
      {record !== null && <SettingsStanding record={record} settingsStanding={settingsStanding} />}
      {ofOthers.length > 0 && (
        <p className="mt-4 text-sm leading-5">
          <a href="#records" className="text-layout underline underline-offset-4">
            {ofOthers.length === 1 ? '1 record' : `${ofOthers.length} records`} of earlier revisions, drawn
            otherwise
          </a>
        </p>
      )}
    </section>
  );
}
