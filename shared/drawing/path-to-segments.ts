import type { OutlineBuilder } from './outline-builder.ts';
import { type PathData, valueCount } from './path-grammar.ts';

/**
 * Draws path data: resolves relative commands and reflects the control points of smooth ones
 * (SVG 2, Paths, 9.3). Values that are missing cannot occur: the grammar counted them.
 */
export function drawPath(data: PathData, pen: OutlineBuilder): void {
  const { codes, values } = data;
  let at = 0;
  let controlX = 0;
  let controlY = 0;
  // Lower-case letter of the command before: decides what smooth commands reflect.
  let previous = 0;
  const value = (offset: number) => values[at + offset] ?? 0;
  for (const code of codes) {
    const isRelative = code >= 97;
    const letter = isRelative ? code : code + 32;
    const { x, y } = pen;
    const baseX = isRelative ? x : 0;
    const baseY = isRelative ? y : 0;
    switch (letter) {
      case 109: // m
        pen.moveTo(baseX + value(0), baseY + value(1));
        break;
      case 108: // l
        pen.lineTo(baseX + value(0), baseY + value(1));
        break;
      case 104: // h
        pen.lineTo(baseX + value(0), y);
        break;
      case 118: // v
        pen.lineTo(x, baseY + value(0));
        break;
      case 99: // c
        controlX = baseX + value(2);
        controlY = baseY + value(3);
        pen.cubicTo(
          baseX + value(0),
          baseY + value(1),
          controlX,
          controlY,
          baseX + value(4),
          baseY + value(5),
        );
        break;
      case 115: {
        // s
        const smooth = previous === 99 || previous === 115;
        const firstX = smooth ? 2 * x - controlX : x;
        const firstY = smooth ? 2 * y - controlY : y;
        controlX = baseX + value(0);
        controlY = baseY + value(1);
        pen.cubicTo(firstX, firstY, controlX, controlY, baseX + value(2), baseY + value(3));
        break;
      }
      case 113: // q
        controlX = baseX + value(0);
        controlY = baseY + value(1);
        pen.quadraticTo(controlX, controlY, baseX + value(2), baseY + value(3));
        break;
      case 116: {
        // t
        const smooth = previous === 113 || previous === 116;
        controlX = smooth ? 2 * x - controlX : x;
        controlY = smooth ? 2 * y - controlY : y;
        pen.quadraticTo(controlX, controlY, baseX + value(0), baseY + value(1));
        break;
      }
      case 97: // a
        pen.arcTo(
          value(0),
          value(1),
          value(2),
          value(3) === 1,
          value(4) === 1,
          baseX + value(5),
          baseY + value(6),
        );
        break;
      default: // z
        pen.close();
    }
    previous = letter;
    at += valueCount(code);
  }
}
