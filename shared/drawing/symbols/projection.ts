import type { CircleMark, LineMark, PolylineMark, SymbolMark } from '../sheet';

/**
 * The sign of the projection method: a truncated cone seen from the side and from its end.
 * First angle (ISO 5456-2): the circles stand on the right of the narrow-left cone; third angle: on its left.
 * (x, y) is the centre, `height` the larger diameter in mm.
 */
export function projectionSymbol(x: number, y: number, height: number, angle: 'first' | 'third'): SymbolMark {
  const big = height / 2;
  const small = height / 4;
  const cone = height * 0.95;
  const gap = height * 0.42;
  const width = cone + gap + height;
  const left = x - width / 2;
  const coneX = angle === 'first' ? left : left + height + gap;
  const circleX = angle === 'first' ? left + cone + gap + big : left + big;
  const marks: (CircleMark | LineMark | PolylineMark)[] = [
    {
      type: 'polyline',
      line: 'symbol',
      closed: true,
      points: [
        { x: coneX, y: y - small },
        { x: coneX + cone, y: y - big },
        { x: coneX + cone, y: y + big },
        { x: coneX, y: y + small },
      ],
    },
    { type: 'circle', line: 'symbol', cx: circleX, cy: y, r: big },
    { type: 'circle', line: 'symbol', cx: circleX, cy: y, r: small },
    { type: 'line', line: 'thin', x1: coneX - 0.6, y1: y, x2: coneX + cone + 0.6, y2: y },
    { type: 'line', line: 'thin', x1: circleX - big - 0.6, y1: y, x2: circleX + big + 0.6, y2: y },
    { type: 'line', line: 'thin', x1: circleX, y1: y - big - 0.6, x2: circleX, y2: y + big + 0.6 },
  ];
  return {
    type: 'symbol',
    name: `${angle}-angle`,
    box: [left - 0.6, y - big - 0.6, left + width + 0.6, y + big + 0.6],
    marks,
  };
}
