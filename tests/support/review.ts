import { vi } from 'vitest';
import type { CutRecord } from '#shared/api/cuts.ts';
import type { Design } from '#shared/api/designs.ts';
import type { Flag } from '#shared/api/flags.ts';
import type { Role } from '#shared/api/vocabulary.ts';
import { cutRecordOf } from './cut.ts';
import { designItem, machineOf } from './design.ts';
import { listOf } from './page.tsx';

// Invented flags and the answers of the review desk, for the tests of its pages.

interface FlagChange extends Partial<Omit<Flag, 'design'>> {
  readonly ownerId?: string;
}

export const flagOf = ({ ownerId = 'wren', ...change }: FlagChange): Flag => ({
  id: 'f1',
  version: 1,
  state: 'open',
  design: { slug: 'wedge', title: 'Wedge', drawingNumber: 'ML-0098', ownerId },
  revision: 1,
  level: 'caution',
  reason: 'It slips.',
  raisedBy: { id: 'tarn', name: 'Tarn' },
  takeCount: 0,
  createdAt: '2026-10-01T10:00:00.000Z',
  ...change,
});

const { outline: _outline, hullMm, cut: _cut, revision, ...words } = designItem({ title: 'Wedge' });
const { boundsMm } = revision.drawing;
const layers = [{ key: 'a', name: 'outside', shapeCount: 1, boundsMm }];
const wren = { id: 'wren', name: 'Wren' };

/** The design that the flags are about, as its sheet shows it. */
export const sheetOf = (change: Partial<Design> = {}): Design => {
  const issued = {
    number: 1,
    geometryHash: 'hash',
    licence: words.licence,
    changeNote: 'first issue',
    createdAt: words.createdAt,
    createdBy: wren,
  };
  return {
    ...words,
    owner: wren,
    revision: {
      ...issued,
      drawing: {
        ...revision.drawing,
        units: { source: 'mm', millimetresPerUnit: { x: 1, y: 1 }, confirmed: true },
        shapeCount: 1,
        segmentCount: 4,
        lengthMm: 280,
        layers,
        warnings: [],
      },
    },
    revisions: [issued],
    cuts: [],
    settingsStanding: [],
    remixes: [],
    takenByMe: false,
    takeCount: 0,
    ...change,
  };
};

export const recordOf = (change: Partial<CutRecord>): CutRecord =>
  cutRecordOf({ id: 'c1', revision: 1, member: wren, ...change });

interface ReviewOptions {
  readonly role?: Role;
  readonly myId?: string;
  readonly design?: Design;
  readonly chainIsWhole?: boolean;
  /** What deciding, or flagging, answers; a success without it. */
  readonly decision?: { readonly status: number; readonly current: unknown };
}

/** Answers every call of the desk and of a sheet; returns what was sent. */
export const answerReview = (flags: readonly Flag[], options: ReviewOptions = {}) => {
  const { role = 'moderator', myId = 'me', design = sheetOf(), chainIsWhole = true, decision } = options;
  const sent: { call: string; body: unknown }[] = [];
  const ofState = (state: string) => listOf(flags.filter((flag) => flag.state === state));
  const entry = {
    number: 7,
    at: '2026-10-02T10:00:00.000Z',
    actorId: myId,
    action: 'flag.decided',
    subject: 'flag:f1',
    detail: { action: 'dismiss' },
    hash: 'a'.repeat(64),
  };
  const answers: Readonly<Record<string, unknown>> = {
    'GET /api/auth/get-session': { session: {} },
    'GET /api/me': { id: myId, name: 'Moss', email: 'm@x', role, club: { name: 'Club' } },
    'GET /api/machines': listOf([machineOf()]),
    'GET /api/flags?state=open': ofState('open'),
    'GET /api/flags?state=decided': ofState('decided'),
    'GET /api/audit': { ...listOf([entry]), chainIsWhole },
    'GET /api/designs/wedge': design,
    'GET /api/designs/wedge/revisions/1/geometry': { boundsMm, layers, shapes: [], hullMm },
  };
  vi.stubGlobal('fetch', async (path: string, init: RequestInit) => {
    const call = `${init.method} ${path}`;
    sent.push({ call, body: typeof init.body === 'string' ? JSON.parse(init.body) : undefined });
    if (init.method === 'POST') {
      if (decision === undefined) return new Response(JSON.stringify(flags[0] ?? {}), { status: 200 });
      const problem = { type: 'flag.decided', title: 'Decided', detail: 'Somebody was faster.', ...decision };
      return new Response(JSON.stringify(problem), { status: decision.status });
    }
    const answer = answers[path.startsWith('/api/designs/wedge/revisions/1/fit') ? '' : call];
    const missing = { type: 'x', title: 'Not there', detail: `no ${path}` };
    return new Response(JSON.stringify(answer ?? missing), { status: answer === undefined ? 404 : 200 });
  });
  return sent;
};
