import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { sql } from 'drizzle-orm';
import type { Router } from 'express';
import { z } from 'zod';
import type { Deps } from '#server/deps.ts';
import { mount } from '#server/http/endpoint-router.ts';
import { projectRoot } from '#server/project-root.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import { packageSettings } from '#shared/api/package.ts';
import { openapiDocument } from './openapi.ts';

export function systemRoutes(router: Router, deps: Deps): void {
  const { version } = JSON.parse(readFileSync(join(projectRoot(), 'package.json'), 'utf8')) as {
    version: string;
  };
  const document = openapiDocument(version, deps.origins[0]);
  const settingsSchema = z.toJSONSchema(packageSettings);
  mount(router, deps, endpoints.health, async () => {
    await deps.database.db.execute(sql`select 1`);
    return { status: 'ok' as const, version, database: deps.database.kind, storage: deps.store.kind };
  });
  mount(router, deps, endpoints.openapi, async () => document);
  mount(router, deps, endpoints.settingsSchema, async () => settingsSchema);
}
