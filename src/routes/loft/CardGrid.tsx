import { useMemo } from 'react';
import type { Bit, Machine } from '#shared/api/bench.ts';
import type { DesignListItem } from '#shared/api/designs.ts';
import type { MaterialFamily } from '#shared/api/vocabulary.ts';
import { BedCard } from '../../components/BedCard.tsx';
import { useUnits } from '../../units/units-context.tsx';
import { cardFit } from './card-fit.ts';

interface CardGridProps {
  readonly items: readonly DesignListItem[];
  readonly machine: Machine | null;
  readonly bits: readonly Bit[];
  readonly material: MaterialFamily | null;
}

/** Cards of one scale, so that sizes compare by eye. */
export function CardGrid({ items, machine, bits, material }: CardGridProps) {
  const { system } = useUnits();
  const fits = useMemo(
    () => items.map((item) => (machine === null ? null : cardFit(item, machine, bits, system))),
    [items, machine, bits, system],
  );
  return (
    <ul className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,19rem),1fr))] gap-6">
      {items.map((item, index) => (
        <li key={item.id} className="grid min-w-0">
          <BedCard
            item={item}
            machine={machine}
            fit={fits[index] ?? null}
            href={`/designs/${item.slug}`}
            material={material ?? undefined}
          />
        </li>
      ))}
    </ul>
  );
}
