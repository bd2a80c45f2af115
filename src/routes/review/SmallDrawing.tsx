import { useQuery } from '@tanstack/react-query';
import { geometryQuery } from '../../api/designs.ts';
import { ShapeLines } from '../../components/ShapeLines.tsx';

interface SmallDrawingProps {
  readonly slug: string;
  readonly revision: number;
}

const boxPx = { width: 144, height: 96, room: 8 };

/** A revision drawn as large as its place in a list allows; decoration beside its title. */
export function SmallDrawing({ slug, revision }: SmallDrawingProps) {
  const { data } = useQuery(geometryQuery(slug, revision));
  if (data === undefined) return <div className="h-24 w-36 border border-dashed border-ink-soft" />;
  const { minX, minY, maxX, maxY } = data.boundsMm;
  const [widthMm, heightMm] = [Math.max(maxX - minX, 0.1), Math.max(maxY - minY, 0.1)];
  const pxPerMm = Math.min(
    (boxPx.width - 2 * boxPx.room) / widthMm,
    (boxPx.height - 2 * boxPx.room) / heightMm,
  );
  const x = (boxPx.width - widthMm * pxPerMm) / 2;
  const y = (boxPx.height - heightMm * pxPerMm) / 2;
  return (
    <svg
      aria-hidden="true"
      viewBox={`0 0 ${boxPx.width} ${boxPx.height}`}
      className="block h-24 w-36 border border-ink bg-paper"
    >
      <g transform={`translate(${x} ${y})`}>
        <ShapeLines geometry={data} pxPerMm={pxPerMm} />
      </g>
    </svg>
  );
}
