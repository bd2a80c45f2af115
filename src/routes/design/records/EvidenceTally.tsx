import type { CutRecord } from '#shared/api/cuts.ts';
import type { Design } from '#shared/api/designs.ts';
import { Tally } from '../../../components/Tally.tsx';
import { standingReasons } from './standing-reasons.ts';

interface EvidenceTallyProps {
  readonly standing: Design['standing'];
  /** Records of this very geometry. */
  readonly records: readonly CutRecord[];
}

/** The tally of each material, with its interval and why it is disputed. */
export function EvidenceTally({ standing, records }: EvidenceTallyProps) {
  if (standing.length === 0) return <Tally standing={null} />;
  return (
    <ul className="space-y-2">
      {standing.map((each) => {
        const { disputed, setAside } = standingReasons(each, records);
        return (
          <li key={each.material}>
            <Tally standing={each} withInterval />
            {disputed !== null && <p className="text-sm leading-5 text-brick">{disputed}</p>}
            {setAside !== null && <p className="text-sm leading-5 text-ink-soft">{setAside}</p>}
          </li>
        );
      })}
    </ul>
  );
}
