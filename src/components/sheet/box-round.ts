interface Box {
  x0: number;
  y0: number;
  x1: number;
  y1: number;
}

const ROOM = 0.6;

/** Puts one box of state behind the texts and symbols of a size. */
export function boxRound(group: SVGGElement, state: string): void {
  const boxes = [
    ...[...group.querySelectorAll('text')].map(textBox),
    ...[...group.querySelectorAll('[data-box]')].map(symbolBox),
  ];
  if (boxes.length === 0) return;
  const x0 = Math.min(...boxes.map((box) => box.x0)) - ROOM;
  const y0 = Math.min(...boxes.map((box) => box.y0)) - ROOM;
  const x1 = Math.max(...boxes.map((box) => box.x1)) + ROOM;
  const y1 = Math.max(...boxes.map((box) => box.y1)) + ROOM;
  const rect = document.createElementNS('http://www.w3.org/2000/svg', 'rect');
  for (const [name, value] of Object.entries({ x: x0, y: y0, width: x1 - x0, height: y1 - y0 }))
    rect.setAttribute(name, String(value));
  rect.setAttribute('class', `state-mark ${state}`);
  group.insertBefore(rect, group.firstChild);
}

/** A text's box by the sheet's own metrics: 0.6 em a letter, 0.85 up, 0.22 down; turned with the text. */
function textBox(text: SVGTextElement): Box {
  const figure = (name: string) => Number(text.getAttribute(name) ?? 0);
  const [size, x, y] = [figure('font-size'), figure('x'), figure('y')];
  const width = 0.6 * size * (text.textContent ?? '').length;
  const anchor = text.getAttribute('text-anchor');
  const left = anchor === 'middle' ? -width / 2 : anchor === 'end' ? -width : 0;
  const [up, down] = [-0.85 * size, 0.22 * size];
  if (text.hasAttribute('transform')) return { x0: x + up, x1: x + down, y0: y - left - width, y1: y - left };
  return { x0: x + left, x1: x + left + width, y0: y + up, y1: y + down };
}

function symbolBox(symbol: Element): Box {
  const [x0 = 0, y0 = 0, x1 = 0, y1 = 0] = (symbol.getAttribute('data-box') ?? '').split(' ').map(Number);
  return { x0, y0, x1, y1 };
}
