import type { Router } from 'express';
import type { Deps } from '#server/deps.ts';
import { mount } from '#server/http/endpoint-router.ts';
import { sendDownload } from '#server/http/send-download.ts';
import { uploadedFile } from '#server/http/upload.ts';
import { requestHash } from '#server/idempotency.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import { correctCut, cutWithHistory } from './correct-cut.ts';
import { cutLog, cutLogFile, cutsOfDesign } from './cut-log.ts';
import { noteInService } from './note-in-service.ts';
import { addPhoto, sendPhoto } from './photos.ts';
import { recordCut } from './record-cut.ts';

export function cutRoutes(router: Router, deps: Deps): void {
  mount(router, deps, endpoints.listCuts, ({ param }) => cutsOfDesign(deps, param('slug')));
  mount(router, deps, endpoints.recordCut, ({ member, param, body, request }) =>
    recordCut(deps, member, param('slug'), body, {
      memberId: member.id,
      key: request.get('Idempotency-Key'),
      request: requestHash('cut', param('slug'), JSON.stringify(body)),
    }),
  );
  mount(router, deps, endpoints.getCut, ({ param }) => cutWithHistory(deps, param('id')));
  mount(router, deps, endpoints.correctCut, ({ member, param, body }) =>
    correctCut(deps, member, param('id'), body),
  );
  mount(router, deps, endpoints.noteInService, ({ member, param, body, request }) =>
    noteInService(deps, member, param('id'), body, {
      memberId: member.id,
      key: request.get('Idempotency-Key'),
      request: requestHash('in-service', param('id'), JSON.stringify(body)),
    }),
  );
  mount(router, deps, endpoints.addPhoto, ({ member, param, request }) => {
    const bytes = uploadedFile(request, 'photo');
    return addPhoto(deps, member, param('id'), bytes, {
      memberId: member.id,
      key: request.get('Idempotency-Key'),
      request: requestHash('photo', param('id'), bytes),
    });
  });
  mount(router, deps, endpoints.getPhoto, async ({ param, response }) => {
    await sendPhoto(deps, response, param('id'));
    return null;
  });
  mount(router, deps, endpoints.cutLog, ({ member, query }) => cutLog(deps, member.id, query));
  mount(router, deps, endpoints.cutLogCsv, async ({ member, query, response }) => {
    const bytes = await cutLogFile(deps, member.id, query);
    sendDownload(response, bytes, 'cut-log.csv', 'text/csv; charset=utf-8; header=present');
    return null;
  });
}
