import type supertest from 'supertest';
import type { Design, DesignDetails } from '#shared/api/designs.ts';
import { detailsOf, plateSvg } from '../../support/samples.ts';
import type { Person } from '../../support/test-club.ts';

export interface Upload {
  svg?: string | Buffer;
  fileName?: string;
  contentType?: string;
}

/** Attaches a drawing to a multipart request, as a browser's form does. */
export function attachDrawing(request: supertest.Test, upload: Upload = {}): supertest.Test {
  const { svg = plateSvg(), fileName = 'plate.svg', contentType = 'image/svg+xml' } = upload;
  return request.attach('file', Buffer.from(svg as string), { filename: fileName, contentType });
}

/** The request that shares a drawing; `details` may be anything, so that wrong ones can be sent too. */
export function share(
  person: Person,
  details: unknown = detailsOf(),
  upload: KeyedUpload = {},
): supertest.Test {
  return shareAt(person, '/api/designs', details, upload);
}

type KeyedUpload = Upload & { key?: string };

function shareAt(person: Person, path: string, details: unknown, upload: KeyedUpload): supertest.Test {
  const request = person.call('post', path).field('details', JSON.stringify(details));
  if (upload.key !== undefined) request.set('Idempotency-Key', upload.key);
  return attachDrawing(request, upload);
}

/** A design that was shared: the answer of a share that must succeed. */
export async function sharedDesign(
  person: Person,
  change: Partial<DesignDetails> = {},
  svg: string = plateSvg(),
): Promise<Design> {
  return (await share(person, detailsOf(change), { svg }).expect(201)).body as Design;
}

/** The request that issues the next revision of a design. */
export const shareRevision = (
  person: Person,
  slug: string,
  change: object = {},
  upload: KeyedUpload = {},
): supertest.Test =>
  shareAt(person, `/api/designs/${slug}/revisions`, { changeNote: 'a wider hole', ...change }, upload);

/** The request that shares a remix of a revision, of the first unless told. */
export const shareRemix = (
  person: Person,
  parentSlug: string,
  change: object = {},
  upload: KeyedUpload = {},
): supertest.Test =>
  shareAt(
    person,
    `/api/designs/${parentSlug}/remixes`,
    { ...detailsOf(), parentRevision: 1, changeNote: 'for a larger bed', ...change },
    upload,
  );
