import { z } from 'zod';
import type { Endpoint } from '../endpoint.ts';

/** The server itself. */
export const systemEndpoints = {
  health: {
    method: 'get',
    path: '/api/health',
    who: 'all',
    summary: 'Whether the server is up, and on what it runs',
    status: 200,
    answer: z.object({
      status: z.literal('ok'),
      version: z.string(),
      database: z.enum(['pglite', 'postgres']),
      storage: z.enum(['local', 's3']),
    }),
  },
  openapi: {
    method: 'get',
    path: '/api/openapi.json',
    who: 'all',
    summary: 'This document',
    status: 200,
    answer: z.looseObject({}),
  },
  settingsSchema: {
    method: 'get',
    path: '/api/schemas/settings.json',
    who: 'all',
    summary: 'JSON Schema of settings.json in a package',
    status: 200,
    answer: z.looseObject({}),
  },
} as const satisfies Record<string, Endpoint>;
