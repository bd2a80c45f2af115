import type { Router } from 'express';
import type { Deps } from '#server/deps.ts';
import { mount } from '#server/http/endpoint-router.ts';
import type { RateLimits } from '#server/http/rate-limits.ts';
import { jsonPart, uploadedDrawing } from '#server/http/upload.ts';
import { validate } from '#server/http/validate.ts';
import { millimetresPerUnit } from '#shared/api/drawings.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import { readUpload } from './read.ts';

export function drawingRoutes(router: Router, deps: Deps, limits: RateLimits): void {
  router.post(endpoints.inspectDrawing.path, limits.inspect);
  mount(router, deps, endpoints.inspectDrawing, async ({ request }) => {
    const stated = validate(
      millimetresPerUnit.optional(),
      jsonPart(request, 'millimetresPerUnit') ?? undefined,
      422,
    );
    const options = stated === undefined ? {} : { millimetresPerUnit: stated };
    return (await readUpload(deps, uploadedDrawing(request), options)).inspection;
  });
}
