import { timestamp, uuid } from 'drizzle-orm/pg-core';

/** An instant, as `timestamptz`, read and written as a Date. */
export const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });

/** Ids are UUIDv7 made by the application, so the database has no default for them. */
export const idColumn = () => uuid('id').primaryKey();
