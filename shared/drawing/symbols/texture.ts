import type { SymbolMark } from '../sheet';

/** Room the surface-texture sign takes along the line, in letter heights. */
export const TEXTURE_ROOM = 1.3;

/** The surface-texture sign for a machined surface (ISO 21920-1: tick closed by a bar). (x, y) is the left end of the baseline. */
export function textureSymbol(x: number, y: number, height: number): SymbolMark {
  const w = height * TEXTURE_ROOM;
  const foot = x + w * 0.3;
  const slope = 1 / Math.tan(Math.PI / 3);
  const short = height * 0.62;
  const long = height * 1.2;
  return {
    type: 'symbol',
    name: 'texture',
    box: [x, y - long, x + w, y],
    marks: [
      {
        type: 'polyline',
        line: 'symbol',
        points: [
          { x: foot - short * slope, y: y - short },
          { x: foot, y },
          { x: foot + long * slope, y: y - long },
        ],
      },
      {
        type: 'line',
        line: 'symbol',
        x1: foot - short * slope,
        y1: y - short,
        x2: foot + short * slope,
        y2: y - short,
      },
    ],
  };
}
