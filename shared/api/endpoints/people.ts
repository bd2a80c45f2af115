import { z } from 'zod';
import type { Endpoint } from '../endpoint.ts';
import * as notices from '../notices.ts';
import * as people from '../people.ts';
import { id } from '../primitives.ts';

/** Members, invitations, notices. */
export const peopleEndpoints = {
  me: {
    method: 'get',
    path: '/api/me',
    who: 'member',
    summary: 'The member signed in',
    status: 200,
    answer: people.me,
  },
  listMembers: {
    method: 'get',
    path: '/api/members',
    who: 'administrator',
    summary: 'The members of the club',
    status: 200,
    answer: people.memberList,
  },
  changeMember: {
    method: 'patch',
    path: '/api/members/:id',
    who: 'administrator',
    summary: 'Change a role, suspend or readmit',
    body: people.memberChange,
    status: 200,
    answer: people.member,
    problems: [404, 409],
  },
  listInvitations: {
    method: 'get',
    path: '/api/invitations',
    who: 'administrator',
    summary: 'Invitations',
    status: 200,
    answer: people.invitationList,
  },
  invite: {
    method: 'post',
    path: '/api/invitations',
    who: 'administrator',
    summary: 'Make a single-use invitation link',
    body: people.invitationCreate,
    status: 201,
    answer: people.invitationMade,
    creates: true,
    problems: [409, 422],
  },
  lookUpInvitation: {
    method: 'get',
    path: '/api/invitations/:code',
    who: 'all',
    summary: 'What an invitation link offers',
    status: 200,
    answer: people.invitationOffer,
    problems: [404, 429],
  },
  acceptInvitation: {
    method: 'post',
    path: '/api/invitations/:code/acceptance',
    who: 'all',
    summary: 'Join the club with an invitation link',
    body: people.invitationAcceptance,
    status: 201,
    answer: z.object({ id, email: z.string() }),
    problems: [404, 409, 429],
  },
  listNotices: {
    method: 'get',
    path: '/api/notices',
    who: 'member',
    summary: 'My notices, newest first',
    status: 200,
    answer: notices.noticeList,
  },
  readNotice: {
    method: 'post',
    path: '/api/notices/:id/read',
    who: 'member',
    summary: 'Mark a notice as read',
    status: 204,
    problems: [404],
  },
} as const satisfies Record<string, Endpoint>;
