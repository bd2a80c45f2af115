import type { cut, machine } from '#server/db/schema/index.ts';

type MachineThen = (typeof cut.$inferSelect)['machine'];

/** The machine as it is at a cut, to be copied into its record: the bench may change later. */
export function machineThen(row: typeof machine.$inferSelect): MachineThen {
  const { ownerId: _owner, version: _version, createdAt: _created, accelerationMmPerS2, ...rest } = row;
  return accelerationMmPerS2 === null ? rest : { ...rest, accelerationMmPerS2 };
}
