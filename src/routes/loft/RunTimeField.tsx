import { useId } from 'react';
import { formatDuration } from '#shared/units/duration.ts';

const stopsMin = [10, 20, 30, 45, 60, 90, 120] as const;
const unlimited = stopsMin.length;

interface RunTimeFieldProps {
  readonly maxMinutes: number | null;
  readonly onChange: (maxMinutes: number | null) => void;
}

const thumb =
  '[&::-webkit-slider-thumb]:-mt-1.5 [&::-webkit-slider-thumb]:h-4 [&::-webkit-slider-thumb]:w-3 [&::-webkit-slider-thumb]:appearance-none [&::-webkit-slider-thumb]:border-0 [&::-webkit-slider-thumb]:bg-layout [&::-webkit-slider-thumb]:[clip-path:polygon(50%_0,100%_40%,100%_100%,0_100%,0_40%)] [&::-moz-range-thumb]:h-4 [&::-moz-range-thumb]:w-3 [&::-moz-range-thumb]:rounded-none [&::-moz-range-thumb]:border-0 [&::-moz-range-thumb]:bg-layout';
const track =
  '[&::-webkit-slider-runnable-track]:h-0.5 [&::-webkit-slider-runnable-track]:bg-ink [&::-moz-range-track]:h-0.5 [&::-moz-range-track]:bg-ink';

/** A rule with a slide: run time under so much. */
export function RunTimeField({ maxMinutes, onChange }: RunTimeFieldProps) {
  const id = useId();
  const place =
    maxMinutes === null ? unlimited : stopsMin.findIndex((stop) => stop >= Math.min(maxMinutes, 120));
  const words = maxMinutes === null ? 'any' : formatDuration(maxMinutes * 60);
  return (
    <div>
      <label htmlFor={id} className="label-narrow flex justify-between text-ink-soft">
        <span>Run time under</span>
        <span className="figures text-sm tracking-normal text-ink normal-case">{words}</span>
      </label>
      <input
        id={id}
        type="range"
        min={0}
        max={unlimited}
        step={1}
        value={place}
        aria-valuetext={words}
        onChange={(event) => onChange(stopsMin[Number(event.target.value)] ?? null)}
        className={`mt-1 block h-6 w-full cursor-pointer appearance-none bg-transparent ${track} ${thumb}`}
      />
      <svg
        aria-hidden="true"
        viewBox="0 0 700 8"
        preserveAspectRatio="none"
        className="-mt-3 block h-2 w-full px-1.5"
      >
        <path
          d={[...stopsMin, null].map((_, index) => `M${index * 100} 0v8`).join('')}
          className="hairline stroke-ink"
        />
      </svg>
      <p aria-hidden="true" className="figures flex justify-between text-xs text-ink-soft">
        <span>10 min</span>
        <span>any</span>
      </p>
      {maxMinutes !== null && (
        <p className="text-xs leading-4 text-ink-soft">Designs without a recorded run time are left out.</p>
      )}
    </div>
  );
}
