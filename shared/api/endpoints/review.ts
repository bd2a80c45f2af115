import type { Endpoint } from '../endpoint.ts';
import * as flags from '../flags.ts';

/** Flags, decisions and the audit log. */
export const reviewEndpoints = {
  raiseFlag: {
    method: 'post',
    path: '/api/flags',
    who: 'member',
    summary: 'Flag a revision, or a record of it',
    body: flags.flagCreate,
    status: 201,
    answer: flags.flag,
    creates: true,
    problems: [404, 409],
  },
  listFlags: {
    method: 'get',
    path: '/api/flags',
    who: 'moderator',
    summary: 'The review desk: gravest and oldest first',
    query: flags.flagQuery,
    status: 200,
    answer: flags.flagList,
  },
  decideFlag: {
    method: 'post',
    path: '/api/flags/:id/decision',
    who: 'moderator',
    summary: 'Decide a flag',
    body: flags.decisionCreate,
    status: 200,
    answer: flags.flag,
    problems: [404, 409],
  },
  audit: {
    method: 'get',
    path: '/api/audit',
    who: 'moderator',
    summary: 'The audit log, newest first',
    query: flags.auditQuery,
    status: 200,
    answer: flags.auditList,
  },
} as const satisfies Record<string, Endpoint>;
