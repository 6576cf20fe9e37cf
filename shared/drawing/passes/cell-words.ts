import { textWidth } from '../text-metrics';

/** Words in lines no wider than the room, broken at spaces, within a word only where it is longer than a line. */
export function wrapWords(text: string, size: number, room: number): string[] {
  const most = Math.max(1, Math.floor(room / textWidth('0', size) + 1e-6));
  const lines: string[] = [];
  let line: string[] = [];
  for (const word of text.split(' ')) {
    let rest = [...word];
    if (line.length > 0 && line.length + 1 + rest.length <= most) {
      line.push(' ', ...rest);
      continue;
    }
    if (line.length > 0) lines.push(line.join(''));
    while (rest.length > most) {
      lines.push(rest.slice(0, most).join(''));
      rest = rest.slice(most);
    }
    line = rest;
  }
  if (line.length > 0 || lines.length === 0) lines.push(line.join(''));
  return lines;
}
