import { useTable } from '@tanstack/react-table';
import { ArrowDown, ArrowUp, ArrowUpDown } from 'lucide-react';
import { useMemo } from 'react';
import type { CutRecord } from '#shared/api/cuts.ts';
import { SelectField } from '../../components/SelectField.tsx';
import { useUnits } from '../../units/units-context.tsx';
import { LogCard } from './LogCard.tsx';
import { logColumns, logFeatures } from './log-columns.tsx';
import { useIsWide } from './use-is-wide.ts';

interface LogTableProps {
  readonly records: CutRecord[];
  readonly withMember: boolean;
}

const sortedBy = { asc: 'ascending', desc: 'descending' } as const;
const arrows = { asc: ArrowUp, desc: ArrowDown } as const;

/** A table with columns to sort by; on a phone each record is a card, sorted the same way. */
export function LogTable({ records, withMember }: LogTableProps) {
  const { system } = useUnits();
  const isWide = useIsWide();
  const columns = useMemo(() => logColumns(system, withMember), [system, withMember]);
  const table = useTable({
    features: logFeatures,
    columns,
    data: records,
    getRowId: ({ id }) => id,
    initialState: { sorting: [{ id: 'cutOn', desc: true }] },
  });
  const { rows } = table.getRowModel();
  const heads = table.getHeaderGroups().flatMap(({ headers }) => headers);

  if (!isWide) {
    const [sort] = table.state.sorting;
    return (
      <div className="space-y-4">
        <SelectField
          label="Order"
          value={sort === undefined ? '' : `${sort.id} ${sort.desc ? 'desc' : 'asc'}`}
          options={heads.flatMap(({ column }) => [
            { value: `${column.id} asc`, label: `${String(column.columnDef.header)}, upwards` },
            { value: `${column.id} desc`, label: `${String(column.columnDef.header)}, downwards` },
          ])}
          onChange={(event) => {
            const [id = 'cutOn', direction] = event.target.value.split(' ');
            table.setSorting([{ id, desc: direction === 'desc' }]);
          }}
        />
        <ul aria-label="Cut records" className="space-y-3">
          {rows.map((row) => (
            <li key={row.id}>
              <LogCard record={row.original} withMember={withMember} />
            </li>
          ))}
        </ul>
      </div>
    );
  }
  return (
    <table className="w-full text-left">
      <caption className="sr-only">Cut records</caption>
      <thead>
        <tr className="border-b-2 border-ink">
          {heads.map((head) => {
            const direction = head.column.getIsSorted();
            const Arrow = direction === false ? ArrowUpDown : arrows[direction];
            return (
              <th
                key={head.id}
                scope="col"
                aria-sort={direction === false ? 'none' : sortedBy[direction]}
                className="py-1 pr-4 align-bottom font-normal"
              >
                <button
                  type="button"
                  onClick={head.column.getToggleSortingHandler()}
                  className="inline-flex min-h-8 items-center gap-1 text-sm text-ink-soft hover:text-ink"
                >
                  <table.FlexRender header={head} />
                  <Arrow size={14} strokeWidth={1.75} aria-hidden="true" />
                </button>
              </th>
            );
          })}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.id} className="border-b border-rule align-top">
            {row.getAllCells().map((cell) => (
              <td key={cell.id} className="py-2 pr-4 last:pr-0">
                <table.FlexRender cell={cell} />
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
