import type { Geometry, Inspection, ShapeGeometry } from '#shared/api/drawings.ts';
import { shapeToPathData } from '#shared/drawing/path-data.ts';
import type { Drawing, DrawingShape } from '#shared/drawing/types.ts';
import { drawingHull } from './drawing-hull.ts';

/** A drawing as the contract shows it: sizes are those of the geometry, not of the page. */
export function toInspection(drawing: Drawing): Inspection {
  return {
    units: drawing.units,
    widthMm: drawing.widthMm,
    heightMm: drawing.heightMm,
    boundsMm: drawing.boundsMm,
    shapeCount: drawing.shapes.length,
    segmentCount: drawing.segmentCount,
    lengthMm: drawing.lengthMm,
    layers: [...drawing.layers],
    warnings: [...drawing.warnings],
    scaleReadings: [...drawing.scaleReadings],
    geometry: toGeometry(drawing),
  };
}

function toGeometry(drawing: Drawing): Geometry {
  return {
    boundsMm: drawing.boundsMm,
    layers: [...drawing.layers],
    shapes: drawing.shapes.map(toShapeGeometry),
    hullMm: drawingHull(drawing),
  };
}

/** A shape counts as closed when all its outlines are: only then can it be a pocket or a profile. */
function toShapeGeometry(shape: DrawingShape): ShapeGeometry {
  return {
    key: shape.key,
    layerKey: shape.layerKey,
    pathData: shapeToPathData(shape),
    closed: shape.outlines.every(({ closed }) => closed),
    boundsMm: shape.boundsMm,
    lengthMm: shape.lengthMm,
  };
}
