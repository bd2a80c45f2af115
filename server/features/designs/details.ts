import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';
import { isUuid } from '#server/db/is-uuid.ts';
import { machine } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';
import { type FieldError, fieldErrors, invalidInput } from '#server/http/validate.ts';
import type { FirstCut } from '#shared/api/cuts.ts';
import { bitOverBed } from '#shared/cuts/contradictions.ts';
import type { MachineRow } from './insert-first-cut.ts';

/** The machine a cut was made on; somebody else's machine is not there for this member. */
async function ownMachine(deps: Deps, memberId: string, machineId: unknown) {
  if (typeof machineId !== 'string' || !isUuid(machineId)) return null;
  const [row] = await deps.database.db
    .select()
    .from(machine)
    .where(and(eq(machine.id, machineId), eq(machine.ownerId, memberId)));
  return row ?? 'not theirs';
}

/** What the fields say of each other and of the machine, beyond what each says alone. */
function contradictions(cut: Record<string, unknown>, machineRow: MachineRow): FieldError[] {
  const diameterMm = (cut['bit'] as { diameterMm?: unknown } | undefined)?.diameterMm;
  return typeof diameterMm === 'number' ? bitOverBed(diameterMm, machineRow, 'cut.bit.diameterMm') : [];
}

/** The details of a share with the machine of their cut, or one problem that names every wrong field at once. */
export async function readDetails<Details extends { cut?: FirstCut | undefined }>(
  deps: Deps,
  memberId: string,
  schema: z.ZodType<Details>,
  input: unknown,
): Promise<{ details: Details; machineRow: MachineRow | null }> {
  if (input === undefined)
    throw new ProblemError(
      400,
      'details.missing',
      'Send the words and settings as JSON in the part “details”.',
    );
  const result = schema.safeParse(input);
  const cut = (input as { cut?: unknown } | null)?.cut;
  const given = typeof cut === 'object' && cut !== null ? (cut as Record<string, unknown>) : null;
  const machineRow = given === null ? null : await ownMachine(deps, memberId, given['machineId']);
  const errors = [
    ...(result.success ? [] : fieldErrors(result.error)),
    ...(given === null || machineRow === null || machineRow === 'not theirs'
      ? []
      : contradictions(given, machineRow)),
  ];
  if (!result.success || errors.length > 0) throw invalidInput(errors, 422);
  if (machineRow === 'not theirs') {
    throw new ProblemError(
      404,
      'machine.not-found',
      'The machine of this cut is not on your bench. Choose one of yours, or add it to your bench first.',
    );
  }
  return { details: result.data, machineRow };
}
