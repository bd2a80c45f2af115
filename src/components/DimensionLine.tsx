interface DimensionLineProps {
  readonly axis: 'x' | 'y';
  /** Ends along the axis. */
  readonly from: number;
  readonly to: number;
  /** Where the line lies on the other axis. */
  readonly at: number;
  /** Where its extension lines start on the other axis; they end just past the dimension line. */
  readonly extendFrom: number;
  readonly label: string;
  readonly fontSize?: number;
}

const ARROW = { length: 9, halfWidth: 2 } as const;
const PAST = 5;

/** A filled arrowhead with its tip at the end of the line (ISO 129). `towards` is 1 or −1 along the axis. */
const arrow = (axis: 'x' | 'y', tip: number, at: number, towards: 1 | -1): string => {
  const back = tip - towards * ARROW.length;
  return axis === 'x'
    ? `M${tip} ${at}L${back} ${at - ARROW.halfWidth}L${back} ${at + ARROW.halfWidth}Z`
    : `M${at} ${tip}L${at - ARROW.halfWidth} ${back}L${at + ARROW.halfWidth} ${back}Z`;
};

/** One dimension with its extension lines, in the colour of the text around it. */
export function DimensionLine({ axis, from, to, at, extendFrom, label, fontSize = 12 }: DimensionLineProps) {
  const middle = (from + to) / 2;
  // Figures are 0.6 of their size wide; the line is broken around them.
  const halfGap = (label.length * 0.6 * fontSize) / 2 + 5;
  const span = to - from;
  const isInLine = span > 2 * (halfGap + ARROW.length + 2);
  // A short span has its arrows outside, pointing in (ISO 129).
  const isShort = span < 2 * ARROW.length + 6;
  const past = at + Math.sign(at - extendFrom) * PAST;
  const along = (start: number, end: number) =>
    axis === 'x' ? `M${start} ${at}H${end}` : `M${at} ${start}V${end}`;
  const across = (place: number) =>
    axis === 'x' ? `M${place} ${extendFrom}V${past}` : `M${extendFrom} ${place}H${past}`;
  const line = isInLine
    ? along(from, middle - halfGap) + along(middle + halfGap, to)
    : isShort
      ? along(from - 16, from) + along(from, to) + along(to, to + 16)
      : along(from, to);
  const away = isInLine ? 0 : fontSize;
  const place = axis === 'x' ? { x: middle, y: at + away } : { x: at - away, y: middle };
  return (
    <g>
      <path d={line + across(from) + across(to)} fill="none" stroke="currentColor" />
      <path
        d={arrow(axis, from, at, isShort ? 1 : -1) + arrow(axis, to, at, isShort ? -1 : 1)}
        fill="currentColor"
      />
      <text
        {...place}
        transform={axis === 'y' ? `rotate(-90 ${place.x} ${place.y})` : undefined}
        textAnchor="middle"
        dominantBaseline="central"
        fontSize={fontSize}
        className="figures fill-current"
      >
        {label}
      </text>
    </g>
  );
}
