import { useId } from 'react';
import { HatchPattern } from './HatchPattern.tsx';

/** The upper left corner of a card that is not handed out: hatched, with the word on it. */
export function WithheldCorner() {
  const id = useId();
  return (
    <div className="pointer-events-none absolute top-0 left-0 text-brick">
      <svg aria-hidden="true" width="112" height="112" viewBox="0 0 112 112" className="block">
        <defs>
          <HatchPattern id={id} spacing={6} />
        </defs>
        <path d="M0 0H112L0 112Z" className="fill-paper" />
        <path d="M0 0H112L0 112Z" fill={`url(#${id})`} />
        <path d="M112 0L0 112" stroke="currentColor" strokeWidth="2" />
      </svg>
      <span className="figures absolute top-2 left-0 border-y-2 border-r-2 border-current bg-paper px-2 text-sm leading-6 font-bold">
        withheld
      </span>
    </div>
  );
}
