import { seededRandom } from './random.ts';

/** A drawing of about `bytes`: paths of 45 segments with curves and arcs, in groups, some transformed. */
export function bigDrawing(bytes: number): { svg: string; pathData: string[] } {
  const random = seededRandom(17);
  const figure = () => (random.next() * 40 - 20).toFixed(3);
  const pathData: string[] = [];
  const parts: string[] = [];
  let size = 0;
  while (size < bytes) {
    const steps: string[] = [`M${(random.next() * 800).toFixed(3)} ${(random.next() * 800).toFixed(3)}`];
    for (let step = 0; step < 45; step += 1) steps.push(segment(step % 5, figure));
    const data = `${steps.join('')}z`;
    pathData.push(data);
    const transform = pathData.length % 4 === 0 ? ' transform="rotate(30 400 400)"' : '';
    const element = `<path${transform} d="${data}" fill="none" stroke="#000"/>`;
    parts.push(element);
    size += element.length;
  }
  const head = '<svg xmlns="http://www.w3.org/2000/svg" width="800mm" height="800mm" viewBox="0 0 800 800">';
  return { svg: `${head}${parts.join('\n')}</svg>`, pathData };
}

function segment(kind: number, figure: () => string): string {
  const many = (count: number) => Array.from({ length: count }, figure).join(' ');
  if (kind === 0) return `l${many(2)}`;
  if (kind === 1) return `c${many(6)}`;
  if (kind === 2) return `q${many(4)}`;
  if (kind === 3) return `a5 8 20 0 1 ${many(2)}`;
  return `h${figure()}v${figure()}`;
}
