import { desc } from 'drizzle-orm';
import express from 'express';
import { design } from '#server/db/schema/index.ts';
import { bigClub } from './big-club.ts';
import { median, percentile, type Row, timesMs } from './measure.ts';

const count = 10_000;

/** The loft's list and a design's page over HTTP, beside a bare Express route that reads a page of the table. */
export async function listRouteRows(): Promise<Row[]> {
  const club = await bigClub(count);
  const bareApp = express();
  bareApp.get('/bare', async (_request, response) => {
    response.json(
      await club.deps.database.db.select().from(design).orderBy(desc(design.createdAt)).limit(24),
    );
  });
  const [ours, bare] = [await club.listen(club.app), await club.listen(bareApp)];
  try {
    const headers = await club.signIn(ours.url);
    const get = (path: string) => async () => {
      const answer = await fetch(ours.url + path, { headers });
      if (answer.status !== 200) throw new Error(`${path} answered ${answer.status}`);
      await answer.arrayBuffer();
    };
    const bareMs = await timesMs(
      async () => void (await (await fetch(`${bare.url}/bare`)).arrayBuffer()),
      60,
      10,
    );
    const listMs = await timesMs(get('/api/designs'), 60, 10);
    const pageMs = await timesMs(get('/api/designs/design-5000'), 60, 10);
    const bareMedian = median(bareMs);
    const row = (name: string, times: number[], limit: number): Row => ({
      name,
      value: median(times),
      unit: 'ms',
      against: `95th percentile ${percentile(times, 0.95).toFixed(1)} ms; bare Express + PGlite route ${bareMedian.toFixed(1)} ms`,
      limit,
      reached: median(times) <= limit,
    });
    return [
      row(`list of ${count} designs, first page with facets, median over HTTP`, listMs, bareMedian + 50),
      row(`page of one design among ${count}, median over HTTP`, pageMs, bareMedian + 15),
    ];
  } finally {
    await ours.close();
    await bare.close();
    await club.close();
  }
}
