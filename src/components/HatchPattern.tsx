interface HatchPatternProps {
  readonly id: string;
  /** Distance between the lines. */
  readonly spacing: number;
}

/** Lines at 45° in the colour around them (ISO 128). */
export function HatchPattern({ id, spacing }: HatchPatternProps) {
  return (
    <pattern
      id={id}
      width={spacing}
      height={spacing}
      patternUnits="userSpaceOnUse"
      patternTransform="rotate(45)"
    >
      <path d={`M0 0V${spacing}`} stroke="currentColor" strokeWidth="1.4" />
    </pattern>
  );
}
