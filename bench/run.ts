import { writeFileSync } from 'node:fs';
import { drawingRows } from './drawing.ts';
import { listRouteRows } from './list-route.ts';
import type { Row } from './measure.ts';
import { searchRows } from './search.ts';

// Every figure stands beside its comparison of the same run: absolute times say little on a shared machine.
const rows: Row[] = [...(await drawingRows()), ...(await searchRows()), ...(await listRouteRows())];

const shown = (row: Row) =>
  `| ${row.name} | ${row.value.toFixed(1)} ${row.unit} | ${row.limit.toFixed(1)} ${row.unit} | ${row.reached ? 'reached' : 'NOT reached'} | ${row.against} |`;
process.stdout.write(
  ['| work | measured | at most | | in the same run |', '|---|---|---|---|---|', ...rows.map(shown), ''].join(
    '\n',
  ),
);
writeFileSync('bench/results.json', `${JSON.stringify(rows, null, 2)}\n`);
