import { useQuery } from '@tanstack/react-query';
import { formatSize } from '#shared/units/length.ts';
import { stockQuery, useRemoveStock } from '../../api/stock.ts';
import { useUnits } from '../../units/units-context.tsx';
import { familyLabels } from '../../words/labels.ts';
import { BenchSection } from './BenchSection.tsx';
import { addHref, changeHref } from './bench-address.ts';
import { ThingRow } from './ThingRow.tsx';
import type { useRemoval } from './use-removal.ts';

export function StockList({ removal }: { readonly removal: ReturnType<typeof useRemoval> }) {
  const { system } = useUnits();
  const { data } = useQuery(stockQuery);
  const { mutateAsync } = useRemoveStock();
  const pieces = (data?.items ?? []).filter(({ id }) => !removal.isHidden(id));
  return (
    <BenchSection
      title="Stock"
      count={pieces.length}
      addHref={addHref('stock')}
      does="Add stock"
      empty="No stock noted. Add a sheet or an offcut, with its thickness measured, to ask of any design whether it can be cut from it."
    >
      <ul>
        {pieces.map(({ id, name, materialId, lengthMm, widthMm, thicknessMm }) => (
          <ThingRow
            key={id}
            name={name}
            facts={`${familyLabels[materialId]} · ${formatSize([lengthMm, widthMm, thicknessMm], system, { digits: 2, trim: true })}`}
            changeHref={changeHref('stock', id)}
            onRemove={() => removal.remove({ id, name, send: mutateAsync })}
          />
        ))}
      </ul>
    </BenchSection>
  );
}
