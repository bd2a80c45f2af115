import type { DrawingSummary } from '#shared/api/drawings.ts';
import { formatSize } from '#shared/units/length.ts';
import { useUnits } from '../../units/units-context.tsx';

/** The layers of a drawing, each with how many shapes it holds and how large they are together. */
export function LayerTable({ layers }: Pick<DrawingSummary, 'layers'>) {
  const { system } = useUnits();
  return (
    <section aria-labelledby="layers-head" className="min-w-0">
      <h2 id="layers-head" className="label-narrow mb-1 text-ink-soft">
        {layers.length === 1 ? '1 layer' : `${layers.length} layers`}
      </h2>
      <table className="w-full text-sm leading-5">
        <thead className="sr-only">
          <tr>
            <th scope="col">Layer</th>
            <th scope="col">Shapes</th>
            <th scope="col">Size</th>
          </tr>
        </thead>
        <tbody>
          {layers.map(({ key, name, shapeCount, boundsMm }) => (
            <tr key={key} className="border-t border-rule align-baseline">
              <td className="py-1.5 pr-3 wrap-anywhere">{name}</td>
              <td className="figures py-1.5 pr-3 text-right whitespace-nowrap text-ink-soft">
                {shapeCount === 1 ? '1 shape' : `${shapeCount} shapes`}
              </td>
              <td className="figures py-1.5 text-right whitespace-nowrap">
                {formatSize([boundsMm.maxX - boundsMm.minX, boundsMm.maxY - boundsMm.minY], system)}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
