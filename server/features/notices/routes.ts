import type { Router } from 'express';
import type { Deps } from '#server/deps.ts';
import { mount } from '#server/http/endpoint-router.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import { listNotices, readNotice } from './my-notices.ts';

export function noticeRoutes(router: Router, deps: Deps): void {
  mount(router, deps, endpoints.listNotices, ({ member }) => listNotices(deps, member.id));
  mount(
    router,
    deps,
    endpoints.readNotice,
    async ({ member, param }) => void (await readNotice(deps, member.id, param('id'))),
  );
}
