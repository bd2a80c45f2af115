import { Bezier } from 'bezier-js';
import SVGPathCommander from 'svg-path-commander';
import { SVGPathData } from 'svg-pathdata';
import svgpath from 'svgpath';
import { describe, expect, it } from 'vitest';
import { boundsOf, furthest, readPath } from './support.ts';

/** A small generator with a seed, so that the same paths are drawn on every run (mulberry32). */
function generator(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** Path data with every command, absolute and relative, smooth after any other, flags run together. */
function randomPath(random: () => number): string {
  const number = () => String(Math.round((random() * 160 - 60) * 100) / 100);
  const numbers = (count: number) => Array.from({ length: count }, number).join(' ');
  const flag = () => (random() < 0.5 ? '0' : '1');
  const commands = 'LlHhVvCcSsQqTtAaZz';
  let pathData = `M${numbers(4)}`;
  const count = 3 + Math.floor(random() * 8);
  for (let i = 0; i < count; i++) {
    const letter = commands.charAt(Math.floor(random() * commands.length));
    const values: Record<string, () => string> = {
      l: () => numbers(2),
      h: number,
      v: number,
      c: () => numbers(6),
      s: () => numbers(4),
      q: () => numbers(4),
      t: () => numbers(2),
      a: () =>
        `${(random() * 60 + 1).toFixed(2)} ${(random() * 60 + 1).toFixed(2)} ${number()} ${flag()}${flag()}${numbers(2)}`,
      // A move that draws nothing is not geometry to us, yet some libraries count it: draw after each.
      z: () => `m${numbers(2)}l${numbers(2)}`,
    };
    pathData += letter + values[letter.toLowerCase()]!();
  }
  return `${pathData}l1 1`;
}

/** Bounds from svgpath's absolute, unarced path and bezier-js's boxes; its cubic arcs err by up to 3e-4 of r. */
function bySvgpathAndBezier(pathData: string): number[] {
  const xs: number[] = [];
  const ys: number[] = [];
  let startX = 0;
  let startY = 0;
  svgpath(pathData)
    .abs()
    .unshort()
    .unarc()
    .iterate((segment, _index, x, y) => {
      const [letter, ...values] = segment as [string, ...number[]];
      if (letter === 'M') [startX, startY] = values as [number, number];
      else if (letter === 'Z') {
        xs.push(startX);
        ys.push(startY);
      } else if (letter === 'C' || letter === 'Q') {
        const box = new Bezier(x, y, ...values).bbox();
        xs.push(box.x.min, box.x.max);
        ys.push(box.y.min, box.y.max);
      } else {
        xs.push(x, letter === 'V' ? x : values[0]!);
        ys.push(y, letter === 'H' ? y : letter === 'V' ? values[0]! : values[1]!);
      }
    });
  return [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)];
}

function bySvgPathData(pathData: string): number[] {
  const { minX, minY, maxX, maxY } = new SVGPathData(pathData).getBounds();
  return [minX, minY, maxX, maxY];
}

function byCommander(pathData: string): number[] {
  const { x, y, x2, y2 } = SVGPathCommander.getPathBBox(pathData);
  return [x, y, x2, y2];
}

const PATHS = 300;
/** Arcs as cubics are loose by 2.8e-4 of a radius, here at most some hundred mm. */
const LIBRARIES_AGREE_MM = 0.05;

describe('bounds against independent libraries', () => {
  const random = generator(20_260_131);
  const cases = Array.from({ length: PATHS }, () => {
    const pathData = randomPath(random);
    const libraries = [byCommander(pathData), bySvgPathData(pathData), bySvgpathAndBezier(pathData)];
    return { pathData, libraries, ours: boundsOf(readPath(pathData)) };
  });

  it('agree with at least two of svg-path-commander, svg-pathdata, svgpath + bezier-js on every path on which two agree', () => {
    let settled = 0;
    for (const { pathData, libraries, ours } of cases) {
      const agreeing = libraries.filter((one) =>
        libraries.some((other) => other !== one && furthest(one, other) < LIBRARIES_AGREE_MM),
      );
      if (agreeing.length < 2) continue;
      settled++;
      const nearest = agreeing.filter((bounds) => furthest(bounds, ours) < LIBRARIES_AGREE_MM);
      expect(nearest.length, pathData).toBeGreaterThanOrEqual(2);
    }
    expect(settled).toBeGreaterThan(PATHS * 0.95);
  });

  // Both lose up to 6e-6 mm in arcs whose radii had to be scaled up: √(1 − Λ) of a rounding error.
  it('agree within 1e-5 with svg-pathdata or svg-path-commander, which keep arcs exact, on nearly all', () => {
    const exact = cases.filter(({ libraries, ours }) =>
      libraries.slice(0, 2).some((bounds) => furthest(bounds, ours) < 1e-5),
    );
    expect(exact.length).toBeGreaterThan(PATHS * 0.95);
  });

  it('lengths agree with svg-path-commander within its own 1e-3', () => {
    const close = cases.filter(({ pathData }) => {
      const theirs = SVGPathCommander.getTotalLength(pathData);
      return Math.abs(readPath(pathData).lengthMm / theirs - 1) < 1e-3;
    });
    expect(close.length).toBeGreaterThan(PATHS * 0.95);
  });
});
