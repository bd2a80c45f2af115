import { AnalysisBusy, type ReadDrawing } from '#server/analysis/pool.ts';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';

/** Reads a drawing in the worker; what cannot be read becomes a 422 with its place in the file. */
export async function readUpload(
  deps: Deps,
  svgBytes: Buffer,
  options: { title?: string; millimetresPerUnit?: number },
): Promise<ReadDrawing> {
  const result = await deps.analysis.inspect(svgBytes, options).catch((error: unknown) => {
    if (!(error instanceof AnalysisBusy)) throw error;
    throw new ProblemError(
      503,
      'analysis.busy',
      'Many drawings are being read just now. Try again in a few seconds.',
      { retryAfterS: 5 },
    );
  });
  if (result.ok) return result.read;
  const { code, message, line, column } = result.refusal;
  const place =
    line === undefined ? '' : ` (line ${line}${column === undefined ? '' : `, column ${column}`})`;
  throw new ProblemError(422, `drawing.${code}`, `${message}${place}`);
}
