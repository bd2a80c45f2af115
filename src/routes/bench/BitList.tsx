import { useQuery } from '@tanstack/react-query';
import { bitsQuery, useRemoveBit } from '../../api/bits.ts';
import { useUnits } from '../../units/units-context.tsx';
import { BenchSection } from './BenchSection.tsx';
import { addHref, changeHref } from './bench-address.ts';
import { BitDrawing } from './bit/BitDrawing.tsx';
import { sayBit } from './bit/say-bit.ts';
import { ThingRow } from './ThingRow.tsx';
import type { useRemoval } from './use-removal.ts';

export function BitList({ removal }: { readonly removal: ReturnType<typeof useRemoval> }) {
  const { system } = useUnits();
  const { data } = useQuery(bitsQuery);
  const { mutateAsync } = useRemoveBit();
  const bits = (data?.items ?? []).filter(({ id }) => !removal.isHidden(id));
  return (
    <BenchSection
      title="Bit drawer"
      count={bits.length}
      addHref={addHref('bit')}
      does="Add a bit"
      empty="The drawer is empty. Add the bits you own: the loft then says which designs you can cut with them."
    >
      <ul>
        {bits.map((bit) => (
          <ThingRow
            key={bit.id}
            name={bit.name}
            facts={sayBit(bit, system)}
            drawing={<BitDrawing bit={bit} />}
            changeHref={changeHref('bit', bit.id)}
            onRemove={() => removal.remove({ id: bit.id, name: bit.name, send: mutateAsync })}
          />
        ))}
      </ul>
    </BenchSection>
  );
}
