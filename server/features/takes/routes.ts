import type { Router } from 'express';
import type { Deps } from '#server/deps.ts';
import { machineOfMember } from '#server/features/bench/machine-of-member.ts';
import { ancestorsOf } from '#server/features/designs/lineage.ts';
import type { RevisionOfDesign } from '#server/features/designs/queries.ts';
import { requireAvailable } from '#server/features/designs/require-available.ts';
import { requireRevision } from '#server/features/designs/require-revision.ts';
import { type Call, mount } from '#server/http/endpoint-router.ts';
import { sendDownload, sendsFirstByte } from '#server/http/send-download.ts';
import { endpoints } from '#shared/api/endpoints.ts';
import { licenceAndCredits } from './licence-and-credits.ts';
import { packageSettings } from './package-settings.ts';
import { recordTake } from './record-take.ts';
import { revisionPackage } from './revision-package.ts';
import { whichRecord } from './which-record.ts';

type TakeCall = Call<typeof endpoints.takeDrawing> | Call<typeof endpoints.takePackage>;

export function takeRoutes(router: Router, deps: Deps): void {
  mount(router, deps, endpoints.takeDrawing, async (call) => {
    const { found } = await startTake(deps, call);
    const bytes = await deps.store.read(found.revision.drawingKey);
    await writeTake(deps, call, found, 'drawing', call.query.recordId, bytes.length);
    sendDownload(call.response, bytes, fileName(found, 'svg'), 'image/svg+xml');
    return null;
  });
  mount(router, deps, endpoints.takePackage, async (call) => {
    const { found, record, cautions } = await startTake(deps, call);
    const ancestors = await ancestorsOf(deps.database.db, found.design.parentRevisionId);
    const settings = packageSettings(found, record, cautions, endpoints.settingsSchema.path);
    const bytes = revisionPackage({
      drawingSvg: await deps.store.read(found.revision.drawingKey),
      originalSvg: await deps.store.read(found.revision.originalKey),
      settings,
      licenceAndCredits: licenceAndCredits(found, ancestors, settings),
    });
    await writeTake(deps, call, found, 'package', record?.cut.id, bytes.length);
    sendDownload(call.response, bytes, fileName(found, 'zip'), 'application/zip');
    return null;
  });
}

/** Everything that can be refused is refused before a take is written. */
async function startTake(deps: Deps, call: TakeCall) {
  const found = await requireRevision(deps, call.param('slug'), call.param('number'));
  const availability = await requireAvailable(deps.database.db, found);
  if (call.query.machineId !== undefined) await machineOfMember(deps, call.member.id, call.query.machineId);
  const record = await whichRecord(deps, found.revision.geometryHash, call.query.recordId);
  return { found, record, cautions: availability.cautions.map(({ reason }) => reason) };
}

async function writeTake(
  deps: Deps,
  call: TakeCall,
  found: RevisionOfDesign,
  what: 'drawing' | 'package',
  cutId: string | undefined,
  sizeBytes: number,
) {
  if (!sendsFirstByte(call.request, sizeBytes)) return;
  await recordTake(deps, {
    memberId: call.member.id,
    revisionId: found.revision.id,
    what,
    machineId: call.query.machineId,
    cutId,
  });
}

const fileName = ({ design, revision }: RevisionOfDesign, ending: string) =>
  `${design.drawingNumber}-rev${revision.number}-${design.slug}.${ending}`;
