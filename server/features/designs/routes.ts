import type { Request, Router } from 'express';
import type { z } from 'zod';
import type { Deps } from '#server/deps.ts';
import { mount } from '#server/http/endpoint-router.ts';
import { jsonPart, uploadedDrawing } from '#server/http/upload.ts';
import { type Repeatable, requestHash } from '#server/idempotency.ts';
import type { FirstCut } from '#shared/api/cuts.ts';
import { designDetails, remixDetails, revisionDetails } from '#shared/api/designs.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import { readDetails } from './details.ts';
import { changeDesign, designNotFound, getDesign, withdrawDesign } from './edit.ts';
import { geometryOf } from './queries.ts';
import { requireRevision } from './require-revision.ts';
import { searchDesigns } from './search.ts';
import { type Share, shareDesign } from './share.ts';
import { shareRemix } from './share-remix.ts';
import { requireOwnDesign, shareRevision } from './share-revision.ts';

export function designRoutes(router: Router, deps: Deps): void {
  mount(router, deps, endpoints.listDesigns, ({ member, query }) => searchDesigns(deps, member.id, query));
  mount(router, deps, endpoints.shareDesign, async ({ member, request }) => {
    const { share, repeatable } = await sharedBy(deps, member.id, request, designDetails, 'design');
    return shareDesign(deps, share, repeatable);
  });
  mount(router, deps, endpoints.shareRevision, async ({ member, param, request }) => {
    const slug = param('slug');
    // Before anything is said of what they sent: it is not theirs to revise.
    await requireOwnDesign(deps.database.db, member.id, slug);
    const what = `revision of ${slug}`;
    const { share, repeatable } = await sharedBy(deps, member.id, request, revisionDetails, what);
    return shareRevision(deps, slug, share, repeatable);
  });
  mount(router, deps, endpoints.shareRemix, async ({ member, param, request }) => {
    const slug = param('slug');
    const what = `remix of ${slug}`;
    const { share, repeatable } = await sharedBy(deps, member.id, request, remixDetails, what);
    return shareRemix(deps, slug, share, repeatable);
  });
  mount(router, deps, endpoints.getDesign, ({ member, param }) => getDesign(deps, param('slug'), member.id));
  mount(router, deps, endpoints.changeDesign, ({ member, param, body }) =>
    changeDesign(deps, member, param('slug'), body),
  );
  mount(
    router,
    deps,
    endpoints.withdrawDesign,
    async ({ member, param }) => void (await withdrawDesign(deps, member, param('slug'))),
  );
  mount(router, deps, endpoints.getGeometry, async ({ param }) => {
    const { revision } = await requireRevision(deps, param('slug'), param('number'));
    const geometry = await geometryOf(deps.database.db, revision.id);
    if (geometry === null) throw designNotFound();
    return geometry;
  });
}

/** The drawing and details of a request that shares something, and what tells a repetition of it. */
async function sharedBy<Details extends { cut?: FirstCut | undefined }>(
  deps: Deps,
  memberId: string,
  request: Request,
  schema: z.ZodType<Details>,
  what: string,
): Promise<{ share: Share<Details>; repeatable: Repeatable }> {
  const svgBytes = uploadedDrawing(request);
  const { details, machineRow } = await readDetails(deps, memberId, schema, jsonPart(request, 'details'));
  return {
    share: { memberId, svgBytes, details, machineRow },
    repeatable: {
      memberId,
      key: request.get('Idempotency-Key'),
      request: requestHash(what, svgBytes, JSON.stringify(details)),
    },
  };
}
