import { and, eq } from 'drizzle-orm';
import type { PgColumn } from 'drizzle-orm/pg-core';

/** A bench is its owner's alone: to anybody else its things are not there. */
export const mine = (table: { id: PgColumn; ownerId: PgColumn }, id: string, memberId: string) =>
  and(eq(table.id, id), eq(table.ownerId, memberId));
