import { useWatch } from 'react-hook-form';
import type { Bed } from '../../../drawing/bed-view.ts';
import { BedOutline } from './BedOutline.tsx';
import type { SavedMachine } from './use-machine-form.ts';

const isLength = (mm: number | undefined): mm is number => mm !== undefined && Number.isFinite(mm) && mm >= 0;

/** What was typed so far, as a bed; null while it cannot be drawn. */
const typedBed = (
  bedXMm: number | undefined,
  bedYMm: number | undefined,
  marginMm: Bed['marginMm'],
  clampStripMm: number | undefined,
): Bed | null => {
  if (!isLength(bedXMm) || !isLength(bedYMm) || bedXMm === 0 || bedYMm === 0) return null;
  const { left, right, front, back } = marginMm;
  if (![left, right, front, back, clampStripMm].every(isLength) || !isLength(clampStripMm)) return null;
  const leavesSome = left + right < bedXMm && front + back + clampStripMm < bedYMm;
  return leavesSome ? { bedXMm, bedYMm, marginMm, clampStripMm } : null;
};

/** Draws the bed while it is typed: a slip of the keyboard shows at once. */
export function TypedBed({ saved }: { readonly saved: SavedMachine }) {
  const [bedXMm, bedYMm, marginMm, clampStripMm] = useWatch({
    control: saved.form.control,
    name: ['bedXMm', 'bedYMm', 'marginMm', 'clampStripMm'],
  });
  const bed = typedBed(bedXMm, bedYMm, marginMm, clampStripMm);
  return (
    <figure className="border border-ink bg-film">
      {bed === null ? (
        <p className="px-6 py-16 text-center text-ink-soft">
          The bed is drawn here once its length and width are typed.
        </p>
      ) : (
        <BedOutline bed={bed} label="The bed as typed, from above" />
      )}
      <figcaption className="border-t border-ink bg-paper px-4 py-2 text-sm text-ink-soft">
        From above, front at the bottom. Hatched: kept clear.
      </figcaption>
    </figure>
  );
}
