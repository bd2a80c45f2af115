import { afterEach, describe, expect, it } from 'vitest';
import { startFromSource } from '#server/worker-path.ts';
import { type Analysis, AnalysisBusy, type AnalysisLimits, createAnalysis } from './pool.ts';
import { readBytes } from './read.ts';

const misbehaving = startFromSource(new URL('./testing/misbehaving-worker.ts', import.meta.url));
const plate = Buffer.from(
  '<svg xmlns="http://www.w3.org/2000/svg" width="120mm" height="80mm" viewBox="0 0 120 80"><rect x="10" y="10" width="100" height="60" rx="5"/><circle cx="60" cy="40" r="12"/></svg>',
);

let analysis: Analysis;
afterEach(() => analysis.close());
const open = (limits: AnalysisLimits = {}) => {
  analysis = createAnalysis({ start: misbehaving, ...limits });
  return analysis;
};

const readsThePlate = async () => {
  const result = await analysis.inspect(plate, {});
  // 110 − 10 by 70 − 10: plain arithmetic on the rectangle.
  expect(result.ok && result.read.inspection).toMatchObject({ widthMm: 100, heightMm: 60, shapeCount: 2 });
};

describe('the analysis in its worker', () => {
  it('gives what the same reading gives in the calling thread', async () => {
    analysis = createAnalysis();
    const options = { title: 'A plate', millimetresPerUnit: 2 };
    expect(await analysis.inspect(plate, options)).toEqual(readBytes(plate, options));
    const notUtf8 = Buffer.from([0x3c, 0x73, 0xe9, 0x3e]);
    expect(await analysis.inspect(notUtf8, {})).toEqual(readBytes(notUtf8, {}));
  });

  it('lets as many drawings wait as it says, then is busy, then takes more', async () => {
    open({ maxQueue: 2 });
    const taken = [plate, plate, plate].map((bytes) => analysis.inspect(bytes, {}));
    const oneTooMany = analysis.inspect(plate, {});
    await expect(oneTooMany).rejects.toBeInstanceOf(AnalysisBusy);
    expect((await Promise.all(taken)).map(({ ok }) => ok)).toEqual([true, true, true]);
    await readsThePlate();
  });

  it('ends a drawing past its time, says the limit, and goes on', async () => {
    open({ timeoutMs: 400 });
    const slow = analysis.inspect(plate, { title: 'never end' });
    const next = analysis.inspect(plate, {});
    const result = await slow;
    expect(result).toMatchObject({ ok: false, refusal: { code: 'too-slow' } });
    expect(!result.ok && result.refusal.message).toContain('0.4 s');
    expect((await next).ok).toBe(true);
  });

  it('refuses a drawing that eats the memory, says the limit, and goes on', async () => {
    open({ memoryMb: 64 });
    const result = await analysis.inspect(plate, { title: 'eat memory' });
    expect(result).toMatchObject({ ok: false, refusal: { code: 'too-much-memory' } });
    expect(!result.ok && result.refusal.message).toContain('64 MB');
    await readsThePlate();
  });

  it('throws when the worker crashes, and goes on', async () => {
    open();
    await expect(analysis.inspect(plate, { title: 'crash' })).rejects.toThrow('crashed on purpose');
    await readsThePlate();
    await expect(analysis.inspect(plate, { title: 'exit' })).rejects.toThrow('ended with code 3');
    await readsThePlate();
  });

  it('rejects what is under way and what waits when it is closed', async () => {
    open();
    const jobs = [analysis.inspect(plate, { title: 'never end' }), analysis.inspect(plate, {})];
    const settled = Promise.allSettled(jobs);
    await analysis.close();
    expect((await settled).map(({ status }) => status)).toEqual(['rejected', 'rejected']);
    await expect(analysis.inspect(plate, {})).rejects.toThrow('stopping');
  });
});
