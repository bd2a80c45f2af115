import type { Router } from 'express';
import type { Deps } from '#server/deps.ts';
import { mount } from '#server/http/endpoint-router.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import { fitOfRevision } from './fit-of-revision.ts';

export function fitRoutes(router: Router, deps: Deps): void {
  mount(router, deps, endpoints.fit, ({ member, param, query }) =>
    fitOfRevision(deps, {
      memberId: member.id,
      slug: param('slug'),
      number: param('number'),
      machineId: query.machineId,
      recordId: query.recordId,
      units: query.units,
      bitIds: query.bitIds === undefined ? undefined : [query.bitIds].flat(),
      stockMm: query.stockMm,
    }),
  );
}
