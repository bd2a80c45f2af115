import { sql } from 'drizzle-orm';
import type { Queries } from '#server/db/client.ts';
import { auditEntry, decision } from '#server/db/schema/index.ts';

/**
 * Whether every decision is as the log says: its flag, action and decider, and the hash of its reason; and none is
 * missing, neither in the log nor among the decisions.
 */
export async function decisionsAreAsLogged(db: Queries): Promise<boolean> {
  const logged = sql`(select * from ${auditEntry} where action = 'flag.decided')`;
  const [other] = await db
    .select({ one: sql<number>`1` })
    .from(
      sql`${decision} d full join ${logged} a on a.detail->>'decision' = d.id::text
        where (d.id is null and a.detail ? 'decision') or (d.id is not null and a.number is null)
          or a.detail->>'action' is distinct from d.action
          or a.detail->>'reasonSha256' is distinct from encode(sha256(convert_to(d.reason, 'UTF8')), 'hex')
          or a.actor_id is distinct from d.decided_by
          or a.subject is distinct from 'flag:' || d.flag_id::text`,
    )
    .limit(1);
  return other === undefined;
}
