import type { Router } from 'express';
import { club } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { mount } from '#server/http/endpoint-router.ts';
import type { RateLimits } from '#server/http/rate-limits.ts';
import { createOnce, requestHash } from '#server/idempotency.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import {
  acceptInvitation,
  listInvitations,
  lookUpInvitation,
  makeInvitation,
  withLink,
} from './invitations.ts';
import { changeMember, listMembers } from './members.ts';

export function peopleRoutes(router: Router, deps: Deps, limits: RateLimits): void {
  mount(router, deps, endpoints.me, async ({ member }) => {
    const [row] = await deps.database.db.select({ name: club.name }).from(club);
    return { ...member, club: { name: row?.name ?? 'The club' } };
  });
  mount(router, deps, endpoints.listMembers, () => listMembers(deps));
  mount(router, deps, endpoints.changeMember, ({ member, param, body }) =>
    changeMember(deps, member.id, param('id'), body),
  );

  mount(router, deps, endpoints.listInvitations, () => listInvitations(deps));
  mount(router, deps, endpoints.invite, async ({ member, body, request }) => {
    const repeatable = {
      memberId: member.id,
      key: request.get('Idempotency-Key'),
      request: requestHash('invitation', JSON.stringify(body)),
    };
    const given = {
      role: body.role,
      note: body.note ?? '',
      validDays: body.validDays,
      createdBy: member.id,
      email: body.email,
    };
    const made = await createOnce(deps, repeatable, (tx) => makeInvitation(deps, tx, given));
    if (given.email !== undefined) deps.mail.nudge();
    return withLink(deps, made);
  });
  router.use('/api/invitations/:code', limits.invitations);
  mount(router, deps, endpoints.lookUpInvitation, ({ param }) => lookUpInvitation(deps, param('code')));
  mount(router, deps, endpoints.acceptInvitation, ({ param, body }) =>
    acceptInvitation(deps, param('code'), body),
  );
}
