import { describe, expect, it } from 'vitest';
import { safeNext } from './safe-next.ts';

describe('where to go after signing in', () => {
  it.each(['/bench', '/designs/cam-hold-down?revision=2#fit', '/?q=tray%201%2F4'])('keeps %s', (path) => {
    expect(safeNext(path)).toBe(path);
  });

  it.each([
    null,
    '',
    'bench',
    'https://elsewhere.example/',
    '//elsewhere.example/loft',
    '/\\elsewhere.example',
    '/\t/elsewhere.example',
    '/.//elsewhere.example',
    'javascript:alert(1)',
    '/sign-in?next=/sign-in',
  ])('goes to the loft for %s', (path) => {
    expect(safeNext(path)).toBe('/');
  });
});
