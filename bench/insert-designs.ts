import { design, revision, storedObject } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { searchable } from './search-documents.ts';

const batchSize = 500;

/** Designs with one revision each, put straight into the tables: the benchmark is of reading them. */
export async function insertDesigns(deps: Deps, ownerId: string, count: number): Promise<void> {
  const { documents } = searchable(count, 0);
  const { db } = deps.database;
  const key = 'drawings/bench.svg';
  await db.insert(storedObject).values({
    key,
    sha256: '0'.repeat(64),
    sizeBytes: 1,
    contentType: 'image/svg+xml',
    createdAt: deps.clock.now(),
  });
  for (let from = 0; from < documents.length; from += batchSize) {
    const batch = documents
      .slice(from, from + batchSize)
      .map((document) => ({ ...document, id: deps.ids.next() }));
    await db.insert(design).values(
      batch.map(({ id, slug, drawingNumber, title, summary, kind, tags, createdAt }) => ({
        id,
        slug,
        drawingNumber,
        ownerId,
        title,
        summary,
        kind,
        tags: [...tags],
        createdAt: new Date(createdAt),
        updatedAt: new Date(createdAt),
      })),
    );
    await db.insert(revision).values(
      batch.map(({ id, widthMm, heightMm, hullMm, createdAt }) => ({
        id: deps.ids.next(),
        designId: id,
        number: 1,
        geometryHash: id,
        licence: 'CC-BY-4.0' as const,
        changeNote: 'first issue',
        drawing: {
          units: { source: 'mm', millimetresPerUnit: { x: 1, y: 1 }, confirmed: true },
          widthMm,
          heightMm,
          boundsMm: { minX: 0, minY: 0, maxX: widthMm, maxY: heightMm },
          shapeCount: 1,
          segmentCount: 4,
          lengthMm: 2 * (widthMm + heightMm),
          layers: [],
          warnings: [],
        },
        hullMm: [...hullMm],
        outline: `M0 0H${widthMm}V${heightMm}H0Z`,
        originalKey: key,
        drawingKey: key,
        createdBy: ownerId,
        createdAt: new Date(createdAt),
      })),
    );
  }
}
