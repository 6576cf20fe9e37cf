import type {
  CircleMark,
  Group,
  LineMark,
  LineType,
  Mark,
  PathMark,
  PolylineMark,
  Sheet,
  TextMark,
} from '../drawing/sheet';
import { lineLook } from '../drawing/line-look';
import type { Picture } from '../drawing/picture';

const INK = '#000000';
const FAINT = '#d9d9d9';

/** A number of the sheet: at most three decimals, no negative zero. */
function n(value: number): string {
  if (!Number.isFinite(value)) throw new RangeError(`A sheet cannot hold ${value}.`);
  const rounded = Math.round(value * 1000) / 1000;
  return String(rounded === 0 ? 0 : rounded);
}

function escape(text: string): string {
  return text.replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;').replace(/"/g, '&quot;');
}

function look(line: LineType, filled: boolean | undefined): string {
  const { width, dash } = lineLook[line];
  const fill = filled ? INK : 'none';
  const dashes = dash ? ` stroke-dasharray="${dash}"` : '';
  return `class="ink ${line}" data-line="${line}" stroke="${INK}" stroke-width="${width}" fill="${fill}"${dashes}`;
}

function drawn(mark: LineMark | PolylineMark | PathMark | CircleMark): string {
  switch (mark.type) {
    case 'line':
      return `<line x1="${n(mark.x1)}" y1="${n(mark.y1)}" x2="${n(mark.x2)}" y2="${n(mark.y2)}" ${look(mark.line, false)}/>`;
    case 'circle':
      return `<circle cx="${n(mark.cx)}" cy="${n(mark.cy)}" r="${n(mark.r)}" ${look(mark.line, mark.filled)}/>`;
    case 'polyline': {
      const points = mark.points.map((p) => `${n(p.x)},${n(p.y)}`).join(' ');
      return `<${mark.closed ? 'polygon' : 'polyline'} points="${points}" ${look(mark.line, mark.filled)}/>`;
    }
    case 'path': {
      const d = mark.commands
        .map((c) => {
          if (c.op === 'Z') return 'Z';
          if (c.op === 'A') return `A ${n(c.r)} ${n(c.r)} 0 ${c.large} ${c.sweep} ${n(c.x)} ${n(c.y)}`;
          if (c.op === 'C') return `C ${n(c.x1)} ${n(c.y1)} ${n(c.x2)} ${n(c.y2)} ${n(c.x)} ${n(c.y)}`;
          return `${c.op} ${n(c.x)} ${n(c.y)}`;
        })
        .join(' ');
      return `<path d="${d}" ${look(mark.line, mark.filled)}/>`;
    }
  }
}

function written(mark: TextMark): string {
  const turn = mark.rotate === -90 ? ` transform="rotate(-90 ${n(mark.x)} ${n(mark.y)})"` : '';
  const weight = mark.weight && mark.weight !== 400 ? ` font-weight="${mark.weight}"` : '';
  const kind = mark.faint ? 'faint' : 'text';
  return (
    `<text x="${n(mark.x)}" y="${n(mark.y)}" font-size="${n(mark.size)}" text-anchor="${mark.anchor}"${weight}${turn} ` +
    `class="ink ${kind}" stroke="none" fill="${mark.faint ? FAINT : INK}" xml:space="preserve">${escape(mark.text)}</text>`
  );
}

function markSvg(mark: Mark): string {
  if (mark.type === 'text') return written(mark);
  if (mark.type === 'symbol')
    return (
      `<g data-role="symbol" data-symbol="${escape(mark.name)}" data-box="${mark.box.map(n).join(' ')}">` +
      `${mark.marks.map(drawn).join('')}</g>`
    );
  return drawn(mark);
}

function groupSvg(group: Group): string {
  const attributes = [`data-role="${group.role}"`];
  if (group.view !== undefined) attributes.push(`data-view="${escape(group.view)}"`);
  if (group.scale !== undefined) attributes.push(`data-scale="${n(group.scale)}"`);
  if (group.broken) attributes.push('data-broken="true"');
  if (group.sizeId !== undefined) attributes.push(`data-id="${escape(group.sizeId)}"`);
  if (group.forView !== undefined) attributes.push(`data-for-view="${escape(group.forView)}"`);
  if (group.sizeKind !== undefined) attributes.push(`data-kind="${group.sizeKind}"`);
  if (group.value !== undefined) attributes.push(`data-value="${Number(group.value.toFixed(6))}"`);
  if (group.reference !== undefined)
    attributes.push(`data-reference="${group.reference ? 'true' : 'false'}"`);
  return `<g ${attributes.join(' ')}>\n${group.marks.map(markSvg).join('\n')}\n</g>`;
}

const ROOT_LOOK =
  'font-family="JetBrains Mono, monospace" font-variant-ligatures="none" stroke-linecap="round" stroke-linejoin="round"';

/** A Sheet as one standalone SVG file: true millimetres, black on white, the same bytes for the same sheet. */
export function renderSvg(sheet: Sheet): string {
  const faint = sheet.groups.filter((g) => g.role === 'stamp');
  const rest = sheet.groups.filter((g) => g.role !== 'stamp');
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${n(sheet.width)}mm" height="${n(sheet.height)}mm" ` +
      `viewBox="0 0 ${n(sheet.width)} ${n(sheet.height)}" data-sheet="${sheet.size}" data-style="${sheet.style}" ` +
      `data-unit="${sheet.unit}" data-scale="${n(sheet.scale)}" ${ROOT_LOOK}>`,
    ...[...faint, ...rest].map(groupSvg),
    '</svg>',
    '',
  ].join('\n');
}

/** Line widths of a picture, in its own units: what was cut is twice as heavy as the rest. */
const PICTURE_WIDTHS: Readonly<Record<string, number>> = {
  metal: 1,
  cut: 2.2,
  axis: 0.6,
  held: 0.7,
  centre: 0.9,
  stops: 0.8,
};

/** A picture as SVG that fills whatever holds it; its classes (`metal`, `cut`, `held` …) are for the screen's own colours. */
export function renderPicture(picture: Picture): string {
  const groups = picture.parts.map((part) => {
    const width = PICTURE_WIDTHS[part.class] ?? 1;
    const marks = part.marks
      .map(markSvg)
      .join('')
      .replace(/stroke-width="[^"]*"/g, `stroke-width="${width}"`);
    return `<g class="${part.class}">${marks}</g>`;
  });
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${n(picture.width)} ${n(picture.height)}" ` +
    `class="profile" role="img" ${ROOT_LOOK}>${groups.join('')}</svg>`
  );
}
