import type { MeasuredSize } from '#shared/api/cuts.ts';
import { formatLengthBare } from '#shared/units/length.ts';
import { useUnits } from '../../../units/units-context.tsx';

const head = 'py-1 pl-4 text-right font-normal first:pl-0 first:text-left';
const cell = 'figures py-1 pl-4 text-right first:pl-0 first:text-left';

/** Sizes as drawn and as they came out, with what lies between. */
export function MeasuredTable({ measured }: { readonly measured: readonly MeasuredSize[] }) {
  const { system } = useUnits();
  const say = (mm: number) => formatLengthBare(mm, system, { digits: 2, fractions: false });
  const off = (mm: number) => `${mm < 0 ? '−' : '+'}${say(Math.abs(mm))}`;
  return (
    <table className="text-sm">
      <caption className="sr-only">Sizes as drawn and as measured, in {system}</caption>
      <thead>
        <tr className="border-b border-ink text-ink-soft">
          <th scope="col" className={head}>
            Drawn, {system}
          </th>
          <th scope="col" className={head}>
            Measured
          </th>
          <th scope="col" className={head}>
            Off by
          </th>
        </tr>
      </thead>
      <tbody>
        {measured.map(({ drawnMm, measuredMm }, place) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: two sizes may be alike; their place tells them apart
          <tr key={place} className="border-b border-rule">
            <td className={cell}>{say(drawnMm)}</td>
            <td className={cell}>{say(measuredMm)}</td>
            <td className={cell}>{off(measuredMm - drawnMm)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
