import type { Bit } from '#shared/api/bench.ts';

/** Every bit of the drawer is drawn to this one scale. */
const pxPerMm = 2;
const box = { width: 148, height: 44, middle: 22 } as const;
const shankLengthMm = 18;

/** The end of the bit, from its side: where a V-bit has its point, a ball nose its round. */
const cuttingPart = (bit: Pick<Bit, 'kind' | 'angleDeg'>, from: number, length: number, radius: number) => {
  const { middle } = box;
  const end = from + length;
  const side = (at: number) => `M${from} ${middle - radius}H${at}`;
  const back = `H${from}Z`;
  if (bit.kind === 'v-bit') {
    const half = (((bit.angleDeg ?? 60) / 2) * Math.PI) / 180;
    const point = Math.min(length, radius / Math.tan(half));
    return `${side(end - point)}L${end} ${middle}L${end - point} ${middle + radius}${back}`;
  }
  if (bit.kind === 'ball-nose') {
    const shoulder = Math.max(from, end - radius);
    return `${side(shoulder)}A${radius} ${radius} 0 0 1 ${shoulder} ${middle + radius}${back}`;
  }
  return `${side(end)}V${middle + radius}${back}`;
};

/** The bit from its side, shank left; a picture of what the text beside it says. */
export function BitDrawing({ bit }: { readonly bit: Bit }) {
  const shankRadius = Math.min((bit.shankMm / 2) * pxPerMm, box.middle - 1);
  const radius = Math.min((bit.diameterMm / 2) * pxPerMm, box.middle - 1);
  const from = shankLengthMm * pxPerMm;
  const length = Math.min(bit.cuttingLengthMm * pxPerMm, box.width - from - 2);
  // Strokes along the flutes, leaning as the helix does: an up-cut lifts, a down-cut presses.
  const lean = bit.kind === 'down-cut' ? -1 : bit.kind === 'up-cut' || bit.kind === 'compression' ? 1 : 0;
  const hasFlutes = bit.kind !== 'v-bit' && bit.kind !== 'ball-nose';
  const pitch = Math.max(5, radius * 1.6);
  const count = hasFlutes ? Math.floor((length - radius) / pitch) : 0;
  const flutes = Array.from({ length: Math.max(0, count) }, (_, place) => {
    const at = from + (place + 0.5) * pitch;
    const turn = bit.kind === 'compression' && place >= count / 2 ? -1 : 1;
    const run = lean * turn * radius;
    return lean === 0 ? '' : `M${at} ${box.middle + run}L${at + radius} ${box.middle - run}`;
  }).join('');
  return (
    <svg viewBox={`0 0 ${box.width} ${box.height}`} width={box.width} height={box.height} aria-hidden="true">
      <path
        d={`M1 ${box.middle - shankRadius}H${from}V${box.middle + shankRadius}H1Z`}
        className="fill-film stroke-ink"
      />
      <path d={cuttingPart(bit, from, length, radius)} className="fill-paper stroke-ink" strokeWidth="1.5" />
      <path d={flutes} fill="none" className="stroke-ink" />
      <path
        d={`M0 ${box.middle}H${from + length + 6}`}
        className="stroke-layout"
        strokeDasharray="12 3 2 3"
        strokeWidth="0.75"
      />
    </svg>
  );
}
