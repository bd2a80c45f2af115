import type { Router } from 'express';
import type { Deps } from '#server/deps.ts';
import { mount } from '#server/http/endpoint-router.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import { auditLog } from './audit-log.ts';
import { decideFlag } from './decide-flag.ts';
import { listFlags } from './list-flags.ts';
import { raiseFlag } from './raise-flag.ts';

export function reviewRoutes(router: Router, deps: Deps): void {
  mount(router, deps, endpoints.raiseFlag, ({ member, body, request }) =>
    raiseFlag(deps, member, body, request.get('Idempotency-Key')),
  );
  mount(router, deps, endpoints.listFlags, ({ query }) => listFlags(deps, query));
  mount(router, deps, endpoints.decideFlag, ({ member, param, body }) =>
    decideFlag(deps, member, param('id'), body),
  );
  mount(router, deps, endpoints.audit, ({ query }) => auditLog(deps, query.cursor));
}
