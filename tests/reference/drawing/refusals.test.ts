import { describe, expect, it } from 'vitest';
import { DRAWING_LIMITS } from '#shared/drawing/limits.ts';
import { readDrawing } from '#shared/drawing/read.ts';
import { page, refusalOf } from './support.ts';

const nested = (levels: number) => page(`${'<g>'.repeat(levels)}<path d="M0 0h1"/>${'</g>'.repeat(levels)}`);
const bomb = (inner: string) => {
  const levels = Array.from({ length: 12 }, (_, level) => {
    const uses = `<use href="#n${level}"/>`.repeat(10);
    return `<g id="n${level + 1}">${uses}</g>`;
  });
  return page(`<defs><g id="n0">${inner}</g>${levels.join('')}</defs><use href="#n12"/>`);
};

describe('files that are refused, each with a sentence that says what to change', () => {
  it.each([
    ['empty file', '', 'empty', /empty/],
    ['only white space', '\ufeff \n ', 'empty', /empty/],
    ['plain text', 'G21 G90 G0 X0', 'not-svg', /not an SVG/],
    ['another XML', '<?xml version="1.0"?><kml><a/></kml>', 'not-svg', /“kml”/],
    ['HTML', '<!DOCTYPE html><html><body><svg/></body></html>', 'not-svg', /HTML/],
    ['HTML after a comment', '<!-- page --><html><body/></html>', 'not-svg', /HTML/],
    ['no shapes', page('<g id="empty"/>'), 'no-shapes', /no shapes/],
    ['nothing but text', page('<text>Hi</text>'), 'no-shapes', /Convert text/],
    ['nothing but hidden shapes', page('<rect width="5" height="5" display="none"/>'), 'no-shapes', /hidden/],
    ['nothing but definitions', page('<defs><rect width="5" height="5"/></defs>'), 'no-shapes', /no shapes/],
    [
      'entities',
      '<!DOCTYPE svg [<!ENTITY ns "http://x">]><svg xmlns="&ns;"><path d="M0 0h1"/></svg>',
      'entities',
      /plain SVG/,
    ],
    ['parameter entities', '<!DOCTYPE svg [<!ENTITY % p SYSTEM "file:///x">]><svg/>', 'entities', /ENTITY/],
    ['65 levels', nested(64), 'too-deep', /64 levels.*Ungroup/],
    ['a copy of what it stands in', page('<g id="a"><use href="#a"/></g>'), 'use-loop', /contains itself/],
    [
      'copies that copy each other',
      page('<g id="a"><use href="#b"/></g><g id="b"><use href="#a"/></g>'),
      'use-loop',
      /contains itself/,
    ],
    ['a copy of itself', page('<use id="u" href="#u"/>'), 'use-loop', /contains itself/],
    ['copies of copies of shapes', bomb('<path d="M0 0h1v1h1v1h1v1h1"/>'), 'too-many-segments', /200,000/],
    ['copies of copies of nothing', bomb('<g/>'), 'too-many-elements', /200,000/],
    ['too far right', page('<path d="M0 0H1000001"/>'), 'out-of-range', /1,000,000 mm/],
    ['too far by transform', page('<path transform="scale(1e9)" d="M0 0h1"/>'), 'out-of-range', /transforms/],
    ['a number past all doubles', page('<path d="M0 0L1e999 5"/>'), 'out-of-range', /not finite/],
    [
      'a control point past all doubles',
      page('<path d="M0 0Q1e999 1e999 5 5"/>'),
      'out-of-range',
      /not finite/,
    ],
  ])('%s', (_name, svgText, code, sentence) => {
    const refusal = refusalOf(svgText);
    expect(refusal.code).toBe(code);
    expect(refusal.message).toMatch(sentence);
  });

  it.each([
    ['an unclosed group', '<svg>\n<g>\n</svg>', 3],
    ['an attribute without quotes', '<svg>\n<path d=M0/>\n</svg>', 2],
    ['a doubled attribute', '<svg>\n\n<path d="M0 0h1" d="M0 0h2"/></svg>', 3],
    ['an unknown entity', '<svg>\n<text>&nbsp;</text></svg>', 2],
    ['two roots', '<svg/>\n<svg/>', 2],
    ['a file cut short', '<svg>\n<path d="M0 0', 2],
  ])('broken XML: %s, with its line', (_name, svgText, line) => {
    const refusal = refusalOf(svgText);
    expect(refusal).toMatchObject({ code: 'ill-formed', line });
    expect(refusal.column).toBeGreaterThan(0);
    expect(refusal.message).toContain(`line ${line}`);
  });

  it('a file over 10 MB, counted in bytes', () => {
    const half = 'é'.repeat(DRAWING_LIMITS.fileBytes / 2);
    expect(refusalOf(page(`<desc>${half}</desc>`))).toMatchObject({ code: 'too-large' });
    expect(refusalOf(page(' '.repeat(DRAWING_LIMITS.fileBytes))).message).toMatch(/10 MB/);
  });

  it('more than 200 000 segments in one path, and in moves alone', () => {
    expect(refusalOf(page(`<path d="M0 0${'h1'.repeat(DRAWING_LIMITS.segments + 1)}"/>`)).code).toBe(
      'too-many-segments',
    );
    expect(refusalOf(page(`<path d="${'M0 0'.repeat(DRAWING_LIMITS.segments + 1)}"/>`)).code).toBe(
      'too-many-segments',
    );
  });

  it.each([5_000, 20_000])('%i nested groups: stopped at the 65th, nothing recurses further', (levels) => {
    const refusal = refusalOf(nested(levels));
    expect(refusal.code).toBe('too-deep');
    // 3 characters a group after the root's tag: the place is that of the 64th group.
    expect(refusal.column).toBeLessThan(page('').length + 65 * 3);
  });

  it('a stated scale that is not a size', () => {
    for (const millimetresPerUnit of [0, -1, Number.NaN, Number.POSITIVE_INFINITY, 1e7]) {
      expect(readDrawing(page('<path d="M0 0h1"/>'), { millimetresPerUnit })).toMatchObject({
        ok: false,
        refusal: { code: 'bad-scale' },
      });
    }
  });

  it('messages carry no markup or control characters from the file', () => {
    const { message } = refusalOf(`<a${'b'.repeat(500)}>`);
    expect(message.length).toBeLessThan(300);
    expect(message).not.toMatch(/[<>]/);
  });
});

describe('what lies just within the limits is read', () => {
  it.each([
    ['64 levels with the shape', nested(62)],
    ['±1e6 mm', page('<path d="M-1000000 0H1000000"/>')],
    [
      'a shape copied many times',
      page(`<defs><path id="a" d="M0 0h1"/></defs>${'<use href="#a"/>'.repeat(5000)}`),
    ],
    ['a loop that is never drawn', page('<defs><g id="a"><use href="#a"/></g></defs><path d="M0 0h1"/>')],
    ['a byte order mark', `\ufeff${page('<path d="M0 0h1"/>')}`],
  ])('%s', (_name, svgText) => {
    expect(readDrawing(svgText).ok).toBe(true);
  });
});
