import { Download } from 'lucide-react';
import type { CutRecord } from '#shared/api/cuts.ts';
import type { Design } from '#shared/api/designs.ts';
import { takeHref } from '../../api/designs.ts';
import { Button } from '../../components/Button.tsx';
import { buttonLook } from '../../components/button-look.ts';
import { SafetyNote } from '../../components/SafetyNote.tsx';
import { sayDay } from '../../words/say-day.ts';

interface TakePanelProps {
  readonly design: Design;
  readonly machineId: string | null;
  readonly record: CutRecord | null;
}

const takenBy = (count: number): string => {
  if (count === 0) return 'Nobody has taken it yet.';
  return count === 1 ? 'One member has taken it.' : `${count} members have taken it.`;
};

/** Why it is not handed out; null when it is. */
export const whyNotTaken = ({ withheld, withdrawnAt }: Design): string | null => {
  if (withheld !== undefined)
    return `A moderator withheld it, so it is not handed out; its records stay to be read. The reason: ${withheld.reason}`;
  return withdrawnAt === undefined
    ? null
    : `It was withdrawn on ${sayDay(withdrawnAt)}, so it is not handed out any more. Its records stay to be read.`;
};

/** Taking is a plain download, written down so that a recall would reach the member. */
export function TakePanel({ design, machineId, record }: TakePanelProps) {
  const { slug, revision } = design;
  const settingsWithheld = record?.settingsWithheld !== undefined;
  // A drawing can be taken beside settings that are withheld.
  const given = { machineId, recordId: settingsWithheld ? null : (record?.id ?? null) };
  const notTaken = whyNotTaken(design);
  if (notTaken !== null) {
    return (
      <section aria-label="Take it" className="space-y-3">
        <div className="flex flex-wrap gap-3">
          <Button disabled aria-describedby="not-taken" className="flex-1">
            Take package
          </Button>
          <Button disabled aria-describedby="not-taken">
            Take drawing
          </Button>
        </div>
        <p id="not-taken">{notTaken}</p>
      </section>
    );
  }
  return (
    <section aria-label="Take it" className="space-y-3">
      <div className="flex flex-wrap gap-3">
        {settingsWithheld ? (
          <Button disabled aria-describedby="no-package" className="flex-1">
            Take package
          </Button>
        ) : (
          <a
            href={takeHref(slug, revision.number, 'package.zip', given)}
            download
            className={`${buttonLook('main')} flex-1`}
          >
            <Download size={18} strokeWidth={1.5} aria-hidden="true" />
            Take package
          </a>
        )}
        <a
          href={takeHref(slug, revision.number, 'drawing.svg', given)}
          download
          className={buttonLook('line')}
        >
          Take drawing
        </a>
      </div>
      {settingsWithheld && (
        <p id="no-package">
          The package would hold settings that are withheld. Choose another record, or take the drawing alone.
        </p>
      )}
      <p className="text-sm leading-5 text-ink-soft">
        The package holds the drawing in true millimetres, the original file,{' '}
        {record === null || settingsWithheld
          ? 'no settings, since none are chosen,'
          : `${record.member.name}’s settings`}{' '}
        and the licence with its credits. A take is written down, so that a recall would reach you.{' '}
        {takenBy(design.takeCount)}
      </p>
      <div id="before-you-cut" className="scroll-mt-24">
        <SafetyNote />
      </div>
    </section>
  );
}
