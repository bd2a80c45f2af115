const cautions = [
  'Wear eye, ear and breathing protection; no gloves or loose sleeves near a spindle.',
  'Extraction on before the spindle. Nobody, least of all children, within reach.',
  'Never leave a running machine, and know where its emergency stop is.',
  'Clamps clear of the bit and the dust shoe.',
  'Keep metal swarf and embers out of a wood-dust bin, and look at the bin again half an hour later.',
];

/** The usual cautions. The program advises; it never certifies. */
export function SafetyNote() {
  return (
    <aside aria-label="Safety" className="border-2 border-ochre bg-paper p-4">
      <p className="font-bold">Before you cut</p>
      <ul className="mt-1 list-[square] space-y-1 pl-5">
        {cautions.map((caution) => (
          <li key={caution}>{caution}</li>
        ))}
      </ul>
      <p className="mt-2 text-ink-soft">
        The machine maker’s manual, the limits marked on the bit and local rules come first. These numbers are
        starting points: try them on scrap.
      </p>
    </aside>
  );
}
