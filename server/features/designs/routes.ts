import type { Router } from 'express';
import type { Deps } from '#server/deps.ts';
import { mount } from '#server/http/endpoint-router.ts';
import { jsonPart, uploadedDrawing } from '#server/http/upload.ts';
import { requestHash } from '#server/idempotency.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import { readDetails } from './details.ts';
import { changeDesign, designNotFound, getDesign, withdrawDesign } from './edit.ts';
import { geometryOf } from './queries.ts';
import { requireRevision } from './require-revision.ts';
import { searchDesigns } from './search.ts';
import { shareDesign } from './share.ts';

export function designRoutes(router: Router, deps: Deps): void {
  mount(router, deps, endpoints.listDesigns, ({ member, query }) => searchDesigns(deps, member.id, query));
  mount(router, deps, endpoints.shareDesign, async ({ member, request }) => {
    const svgBytes = uploadedDrawing(request);
    const { details, machineRow } = await readDetails(deps, member.id, jsonPart(request, 'details'));
    return shareDesign(
      deps,
      { memberId: member.id, svgBytes, details, machineRow },
      {
        memberId: member.id,
        key: request.get('Idempotency-Key'),
        request: requestHash('design', svgBytes, JSON.stringify(details)),
      },
    );
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
