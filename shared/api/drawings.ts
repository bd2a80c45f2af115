import { z } from 'zod';

export const boundsMm = z.object({
  minX: z.number(),
  minY: z.number(),
  maxX: z.number(),
  maxY: z.number(),
});

export const drawingUnits = z.object({
  source: z.string(),
  millimetresPerUnit: z.object({ x: z.number(), y: z.number() }),
  confirmed: z.boolean(),
});

export const drawingLayer = z.object({
  key: z.string(),
  name: z.string(),
  shapeCount: z.number().int(),
  boundsMm,
});

export const drawingWarning = z.object({
  code: z.string(),
  message: z.string(),
  line: z.number().int().optional(),
  column: z.number().int().optional(),
  shapeKey: z.string().optional(),
});

/** What is known of a drawing without its outlines. */
export const drawingSummary = z.object({
  units: drawingUnits,
  widthMm: z.number(),
  heightMm: z.number(),
  boundsMm,
  shapeCount: z.number().int(),
  segmentCount: z.number().int(),
  lengthMm: z.number(),
  layers: z.array(drawingLayer),
  warnings: z.array(drawingWarning),
});
export type DrawingSummary = z.infer<typeof drawingSummary>;

export const scaleReading = z.object({
  name: z.enum(['mm', '96 an inch', '90 an inch', '72 an inch']),
  millimetresPerUnit: z.number(),
  widthMm: z.number(),
  heightMm: z.number(),
});
export type ScaleReading = z.infer<typeof scaleReading>;

const shapeGeometry = z.object({
  key: z.string(),
  layerKey: z.string(),
  /** Path data in page millimetres, y down, written by us from the geometry. */
  pathData: z.string(),
  closed: z.boolean(),
  boundsMm,
  lengthMm: z.number(),
});
export type ShapeGeometry = z.infer<typeof shapeGeometry>;

export const geometry = z.object({
  boundsMm,
  layers: z.array(drawingLayer),
  shapes: z.array(shapeGeometry),
  /** Corners of the convex hull of the drawing, for turning it on a bed. */
  hullMm: z.array(z.object({ x: z.number(), y: z.number() })),
});
export type Geometry = z.infer<typeof geometry>;

/** The answer to a drawing that was read without saving it. */
export const inspection = drawingSummary.extend({
  scaleReadings: z.array(scaleReading),
  geometry,
});
export type Inspection = z.infer<typeof inspection>;

/** Millimetres per user unit as stated by the member, when the file does not say. */
export const millimetresPerUnit = z
  .number({ error: 'Millimetres per unit must be a number' })
  .positive('Millimetres per unit must be more than 0')
  .max(1000, 'Millimetres per unit must be at most 1000');
