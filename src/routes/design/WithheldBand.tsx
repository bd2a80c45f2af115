interface WithheldBandProps {
  readonly reason: string;
  /** What it is that is withheld. */
  readonly what: string;
}

/** At the head of a sheet that is not handed out: that it is withheld, by a moderator, and why. */
export function WithheldBand({ reason, what }: WithheldBandProps) {
  return (
    <section aria-label="Withheld" className="relative mb-4 border-2 border-brick bg-paper pl-6">
      <svg aria-hidden="true" className="absolute inset-y-0 left-0 h-full w-6 text-brick">
        <defs>
          <pattern
            id="withheld-hatch"
            width="7"
            height="7"
            patternUnits="userSpaceOnUse"
            patternTransform="rotate(45)"
          >
            <path d="M0 0V7" stroke="currentColor" strokeWidth="2.5" />
          </pattern>
        </defs>
        <rect width="100%" height="100%" fill="url(#withheld-hatch)" />
      </svg>
      <div className="min-w-0 p-4">
        <p className="text-lg leading-7 font-bold text-brick">{what}, withheld by a moderator</p>
        <p className="mt-1 whitespace-pre-line">{reason}</p>
        <p className="mt-1 text-sm leading-5 text-ink-soft">
          It is not handed out until a moderator restores it. If you have cut it, do not use the part before
          you have read the reason.
        </p>
      </div>
    </section>
  );
}
