import { describe, expect, it } from 'vitest';
import { read, refusalOf } from './support.ts';

const SVG = 'http://www.w3.org/2000/svg';
const SIZE = 'width="10mm" height="10mm" viewBox="0 0 10 10"';
const found = (svgText: string) => {
  const { shapes, warnings } = read(svgText);
  return {
    shapes: shapes.map(({ source }) => source.element),
    told: warnings.filter(({ code }) => code === 'foreign-namespace').length,
  };
};

/** Namespaces in XML 1.0 (third edition), S1: what an element is, its namespace decides, not its prefix. */
describe('namespaces', () => {
  it.each([
    [
      'two prefixes for SVG in one file',
      `<svg xmlns="${SVG}" xmlns:svg="${SVG}" ${SIZE}><rect width="4" height="2"/><svg:circle r="2"/></svg>`,
      { shapes: ['rect', 'circle'], told: 0 },
    ],
    [
      'a prefix on the root and none inside',
      `<s:svg xmlns:s="${SVG}" xmlns="${SVG}" ${SIZE}><rect width="4" height="2"/><s:circle r="2"/></s:svg>`,
      { shapes: ['rect', 'circle'], told: 0 },
    ],
    [
      'another prefix declared further in',
      `<svg xmlns="${SVG}" ${SIZE}><v:g xmlns:v="${SVG}"><v:rect width="4" height="2"/></v:g></svg>`,
      { shapes: ['rect'], told: 0 },
    ],
    [
      'a path of another namespace',
      `<svg xmlns="${SVG}" ${SIZE}><rect width="4" height="2"/><path xmlns="http://other.example/" d="M0 0h9v9z"/></svg>`,
      { shapes: ['rect'], told: 1 },
    ],
    [
      'shapes of no namespace under a prefixed root',
      `<s:svg xmlns:s="${SVG}" ${SIZE}><s:rect width="4" height="2"/><rect width="9" height="9"/><g><circle r="9"/></g></s:svg>`,
      { shapes: ['rect'], told: 1 },
    ],
    [
      'the prefix given to another namespace further in',
      `<s:svg xmlns:s="${SVG}" ${SIZE}><s:rect width="4" height="2"/><g xmlns:s="http://other.example/"><s:circle r="9"/></g></s:svg>`,
      { shapes: ['rect'], told: 1 },
    ],
    [
      'SVG shapes inside an element of another namespace',
      `<svg xmlns="${SVG}" xmlns:o="http://other.example/" ${SIZE}><rect width="4" height="2"/><o:wrap><circle r="9"/></o:wrap></svg>`,
      { shapes: ['rect'], told: 1 },
    ],
    [
      'data of an editor and a page inside are nothing to tell',
      `<svg xmlns="${SVG}" xmlns:o="http://other.example/" ${SIZE}><o:view zoom="2"/><metadata><o:g><o:path/></o:g></metadata><foreignObject><o:g/></foreignObject><rect width="4" height="2"/></svg>`,
      { shapes: ['rect'], told: 0 },
    ],
    [
      'no namespace at all is read as SVG',
      `<svg ${SIZE}><rect width="4" height="2"/></svg>`,
      { shapes: ['rect'], told: 0 },
    ],
    [
      'prefixes that nobody declared',
      `<svg xmlns="${SVG}" ${SIZE}><rect id="r" width="4" height="2"/><use xlink:href="#r"/><ed:view/></svg>`,
      { shapes: ['rect', 'rect'], told: 0 },
    ],
    [
      'a root whose prefix nobody declared',
      `<svg:svg ${SIZE}><svg:rect width="4" height="2"/></svg:svg>`,
      { shapes: ['rect'], told: 0 },
    ],
  ])('%s', (_name, svgText, expected) => {
    expect(found(svgText)).toEqual(expected);
  });

  it('a root of another namespace is no drawing', () => {
    const refusal = refusalOf(
      `<svg xmlns="http://other.example/" ${SIZE}><rect width="4" height="2"/></svg>`,
    );
    expect(refusal.code).toBe('not-svg');
    expect(refusal.message).toContain('http://other.example/');
  });
});
