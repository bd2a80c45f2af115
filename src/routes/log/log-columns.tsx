import {
  createColumnHelper,
  createSortedRowModel,
  rowSortingFeature,
  sortFn_alphanumeric,
  sortFn_basic,
  tableFeatures,
} from '@tanstack/react-table';
import { Link } from 'react-router-dom';
import type { CutRecord } from '#shared/api/cuts.ts';
import { formatDuration } from '#shared/units/duration.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { materialLabels, outcomeLabels } from '../../words/labels.ts';
import { sayBitUsed } from '../../words/say-bit-used.ts';
import { sayCutDay } from '../../words/say-cut-day.ts';
import { HowItCameOut } from './HowItCameOut.tsx';
import { sayStock } from './say-stock.ts';

export const logFeatures = tableFeatures({
  rowSortingFeature,
  sortedRowModel: createSortedRowModel(),
  sortFns: { alphanumeric: sortFn_alphanumeric, basic: sortFn_basic },
});

/** Best first, as the vocabulary lists them; from the labels, which weigh nothing. */
const outcomesInOrder = Object.keys(outcomeLabels);

const helper = createColumnHelper<typeof logFeatures, CutRecord>();

/** The columns of the log; each sorts by what is measured, not by how it is written. */
export const logColumns = (system: UnitSystem, withMember: boolean) =>
  helper.columns([
    helper.accessor('cutOn', {
      header: 'Cut on',
      sortFn: 'basic',
      cell: ({ getValue }) => <span className="whitespace-nowrap">{sayCutDay(getValue())}</span>,
    }),
    helper.accessor((record) => record.design.title, {
      id: 'design',
      header: 'Design',
      sortFn: 'alphanumeric',
      cell: ({ row: { original } }) => (
        <Link
          to={`/designs/${original.design.slug}#record-${original.id}`}
          className="text-layout underline underline-offset-4"
        >
          {original.design.title}, rev. {original.revision}
        </Link>
      ),
    }),
    ...(withMember
      ? [
          helper.accessor((record) => record.member.name, {
            id: 'member',
            header: 'Member',
            sortFn: 'alphanumeric',
          }),
        ]
      : []),
    helper.accessor((record) => record.machine.name, {
      id: 'machine',
      header: 'Machine',
      sortFn: 'alphanumeric',
    }),
    helper.accessor((record) => record.bit.diameterMm, {
      id: 'bit',
      header: 'Bit',
      sortFn: 'basic',
      cell: ({ row }) => sayBitUsed(row.original.bit, system),
    }),
    helper.accessor((record) => materialLabels[record.materialId], {
      id: 'material',
      header: 'Material',
      sortFn: 'alphanumeric',
      cell: ({ row }) => sayStock(row.original, system),
    }),
    helper.accessor((record) => outcomesInOrder.indexOf(record.outcome), {
      id: 'outcome',
      header: 'Outcome',
      sortFn: 'basic',
      cell: ({ row }) => <HowItCameOut record={row.original} />,
    }),
    helper.accessor('runTimeS', {
      header: 'Run time',
      sortFn: 'basic',
      cell: ({ getValue }) => (
        <span className="figures text-sm whitespace-nowrap">{formatDuration(getValue())}</span>
      ),
    }),
  ]);
