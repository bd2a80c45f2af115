import { useQuery } from '@tanstack/react-query';
import { SlidersHorizontal } from 'lucide-react';
import { useState } from 'react';
import { meQuery } from '../../api/me.ts';
import { Button } from '../../components/Button.tsx';
import { CheckField } from '../../components/CheckField.tsx';
import { PlanChest } from '../../components/PlanChest.tsx';
import { useUnits } from '../../units/units-context.tsx';
import { countOf, drawersOf, type Facets } from './drawers.ts';
import { FacetLinks } from './FacetLinks.tsx';
import { bitLines, materialLines, standingLines } from './facet-lines.ts';
import type { Filters } from './filters.ts';
import { RunTimeField } from './RunTimeField.tsx';

interface FilterColumnProps {
  readonly facets: Facets;
  readonly filters: Filters;
  readonly machineName: string | null;
  readonly chosenCount: number;
  readonly hrefWith: (change: Partial<Filters>) => string;
  readonly change: (next: Partial<Filters>, inPlace?: boolean) => void;
}

/** Plan chest and filters; on a phone they fold away behind one button. */
export function FilterColumn(props: FilterColumnProps) {
  const { facets, filters, machineName, chosenCount, hrefWith, change } = props;
  const { system } = useUnits();
  const me = useQuery(meQuery).data ?? null;
  const isModerator = me !== null && me.role !== 'member';
  const [isOpen, setIsOpen] = useState(false);
  return (
    <>
      <Button
        className="w-full md:hidden"
        aria-expanded={isOpen}
        aria-controls="filters"
        onClick={() => setIsOpen(!isOpen)}
      >
        <SlidersHorizontal size={18} strokeWidth={1.5} aria-hidden="true" />
        Kinds and filters{chosenCount > 0 ? ` (${chosenCount} set)` : ''}
      </Button>
      <aside
        id="filters"
        aria-label="Kinds and filters"
        className={`space-y-6 md:w-60 ${isOpen ? 'max-md:mt-4' : 'max-md:hidden'}`}
      >
        <PlanChest drawers={drawersOf(facets, filters, hrefWith)} />
        {machineName !== null && (
          <fieldset>
            <legend className="label-narrow mb-1 text-ink-soft">I can cut it now</legend>
            <CheckField
              label="Fits this machine"
              count={countOf(facets.fits, 'true')}
              checked={filters.fits}
              onChange={(event) => change({ fits: event.target.checked })}
            />
          </fieldset>
        )}
        <FacetLinks label="Standing" lines={standingLines(facets, filters, hrefWith, isModerator)} />
        <FacetLinks label="Material" lines={materialLines(facets, filters, hrefWith)} />
        <FacetLinks label="Bit" lines={bitLines(facets, filters, hrefWith, system)} />
        <RunTimeField
          maxMinutes={filters.maxMinutes}
          onChange={(maxMinutes) => change({ maxMinutes }, true)}
        />
      </aside>
    </>
  );
}
