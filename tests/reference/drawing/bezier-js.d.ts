declare module 'bezier-js' {
  /** As far as the tests use it: a quadratic or cubic curve from the flat list of its points. */
  export class Bezier {
    constructor(...coordinates: number[]);
    bbox(): { x: { min: number; max: number }; y: { min: number; max: number } };
  }
}
