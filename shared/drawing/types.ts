/** A point in page millimetres, y down. */
export interface Point {
  readonly x: number;
  readonly y: number;
}

/** An axis-aligned box in page millimetres, y down. */
export interface Bounds {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
}

export interface LineSegment {
  readonly kind: 'line';
  readonly from: Point;
  readonly to: Point;
}

export interface QuadraticSegment {
  readonly kind: 'quadratic';
  readonly from: Point;
  readonly control: Point;
  readonly to: Point;
}

export interface CubicSegment {
  readonly kind: 'cubic';
  readonly from: Point;
  readonly control1: Point;
  readonly control2: Point;
  readonly to: Point;
}

/**
 * An elliptical arc kept exact under every affine transform:
 * P(t) = centre + axisU·cos t + axisV·sin t, t from startAngleRad over sweepAngleRad (signed).
 * axisU and axisV are conjugate half-diameters; they need not be at right angles.
 */
export interface ArcSegment {
  readonly kind: 'arc';
  readonly from: Point;
  readonly to: Point;
  readonly centre: Point;
  readonly axisU: Point;
  readonly axisV: Point;
  readonly startAngleRad: number;
  readonly sweepAngleRad: number;
}

export type Segment = LineSegment | QuadraticSegment | CubicSegment | ArcSegment;

/** One outline: connected segments; closed when the file closed it or its ends meet. */
export interface Outline {
  readonly closed: boolean;
  readonly segments: readonly Segment[];
}

/** Where in the file a shape or a warning came from; line and column start at 1. */
export interface SourcePlace {
  readonly element: string;
  readonly id?: string;
  readonly line: number;
  readonly column: number;
}

export interface DrawingShape {
  /** Stable within a drawing: `s1`, `s2`, … in document order. */
  readonly key: string;
  readonly layerKey: string;
  readonly source: SourcePlace;
  readonly outlines: readonly Outline[];
  readonly boundsMm: Bounds;
  readonly lengthMm: number;
}

export interface DrawingLayer {
  /** Stable within a drawing: `l1`, `l2`, … in order of first shape. */
  readonly key: string;
  /** Plain text, from the nearest labelled group, else from the paint, never markup. */
  readonly name: string;
  readonly shapeCount: number;
  readonly boundsMm: Bounds;
}

export interface DrawingUnits {
  /** What the size was read from: 'mm', 'cm', 'in', 'pt', 'pc', 'q', 'px', 'none', 'percent', 'stated'. */
  readonly source: string;
  readonly millimetresPerUnit: { readonly x: number; readonly y: number };
  /** True for physical units and for a scale the member stated. */
  readonly confirmed: boolean;
}

/** One way to read the size of a file whose units are not confirmed. */
export interface ScaleReading {
  readonly name: 'mm' | '96 an inch' | '90 an inch' | '72 an inch';
  readonly millimetresPerUnit: number;
  readonly widthMm: number;
  readonly heightMm: number;
}

export interface DrawingWarning {
  /** Stable code, kebab-case: 'text-not-outlines', 'path-error', … */
  readonly code: string;
  readonly message: string;
  readonly line?: number;
  readonly column?: number;
  readonly shapeKey?: string;
}

/** An SVG read into millimetres: what can be cut, and what was found on the way. */
export interface Drawing {
  readonly units: DrawingUnits;
  /** Present when the units are not confirmed. */
  readonly scaleReadings: readonly ScaleReading[];
  readonly shapes: readonly DrawingShape[];
  readonly layers: readonly DrawingLayer[];
  readonly boundsMm: Bounds;
  readonly widthMm: number;
  readonly heightMm: number;
  readonly lengthMm: number;
  readonly segmentCount: number;
  readonly warnings: readonly DrawingWarning[];
}

/** Why a file could not be read at all: a sentence for the member, and where. */
export interface DrawingRefusal {
  /** 'not-svg', 'ill-formed', 'empty', 'no-shapes', 'too-large', 'entities', 'too-deep', 'too-many-segments', 'out-of-range' … */
  readonly code: string;
  readonly message: string;
  readonly line?: number;
  readonly column?: number;
}

export type DrawingResult =
  | { readonly ok: true; readonly drawing: Drawing }
  | { readonly ok: false; readonly refusal: DrawingRefusal };
