import { createRequire } from 'node:module';
import { COLORS } from './style';

interface Square {
  x: number;
  y: number;
  w: number;
}

/**
 * A QR code as one vector path that fills its width. pdfmake's own node knows
 * whole points to a module only, which is either too small to scan or too large
 * for the page; its encoder is used, the drawing is not.
 */
export function qrSvg(words: string): string {
  const require = createRequire(import.meta.url);
  const encoder = require('pdfmake/js/qrEnc.js') as {
    default: { measure(node: object): { _canvas: (Square & { color: string })[]; _width: number } };
  };
  const { _canvas, _width } = encoder.default.measure({ qr: words, eccLevel: 'L' });
  // The first square is the ground.
  const d = _canvas
    .slice(1)
    .map(({ x, y, w }) => `M${x} ${y}h${w}v${w}h-${w}z`)
    .join('');
  return `<svg xmlns="http://www.w3.org/2000/svg" width="${_width}" height="${_width}" viewBox="0 0 ${_width} ${_width}"><path d="${d}" fill="${COLORS.ink}"/></svg>`;
}
