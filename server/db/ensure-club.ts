import type { Database } from './client.ts';
import { club } from './schema/index.ts';

/** The club's one row; a demo or an administrator gives it its own name and prefix. */
export async function ensureClub(db: Database): Promise<void> {
  await db.insert(club).values({ name: 'Our club', drawingPrefix: 'TL' }).onConflictDoNothing();
}
