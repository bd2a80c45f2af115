import type { Logger } from 'pino';
import type { Analysis } from './analysis/pool.ts';
import type { Auth } from './auth.ts';
import type { Clock, IdSource } from './clock.ts';
import type { OpenDatabase } from './db/client.ts';
import type { SearchService } from './search/service.ts';
import type { ObjectStore } from './storage/object-store.ts';

/** Everything a feature needs from outside, passed in: nothing is a global. */
export interface Deps {
  database: OpenDatabase;
  store: ObjectStore;
  search: SearchService;
  analysis: Analysis;
  auth: Auth;
  clock: Clock;
  ids: IdSource;
  log: Logger;
  /** Called after a commit that put mail into the outbox, so that it need not wait for the next round. */
  mail: { nudge(): void };
  /** Signs sessions and invitation links. */
  secret: string;
  /** IANA name of the zone that the club's dates are in. */
  clubTimeZone: string;
  trustProxyHops: number;
  /** Where people reach the server: the first is used in links. */
  origins: readonly [string, ...string[]];
}
