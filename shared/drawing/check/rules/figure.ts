import { finding, ofRole, sizeOf } from '../reading';
import type { CheckRule, ReadGroup } from '../reading';

const MM_PER_INCH = 25.4;
const FIGURE = /(?:^|[^A-Za-z0-9.,])(?:S?R)?(\d*[.,]?\d+)/;
const NAMED: readonly string[] = ['thread', 'knurl', 'centre-hole', 'note', 'geometrical', 'texture'];

/** The first figure written in a group, and half of its last decimal. */
function figureOf(group: ReadGroup): { value: number; half: number } | null {
  for (const text of group.texts) {
    if (text.symbol) continue;
    const found = FIGURE.exec(text.text);
    const digits = found?.[1];
    if (digits === undefined) continue;
    const plain = digits.replace(',', '.');
    const decimals = plain.includes('.') ? plain.length - plain.indexOf('.') - 1 : 0;
    return { value: Number(plain), half: 0.5 * 10 ** -decimals };
  }
  return null;
}

/** What is written is what the size is, to the last figure written. */
export const figure: CheckRule = {
  id: 'figure',
  check: (reading) =>
    ofRole(reading, 'dimension').flatMap((group) => {
      const size = sizeOf(reading, group.group.sizeId);
      if (!size) return [];
      if (NAMED.includes(size.kind)) {
        const name = size.designation ?? size.typed;
        return group.texts.some((t) => t.text === name)
          ? []
          : [finding('figure', `${size.id} must read ${name}.`, [size.id])];
      }
      const written = figureOf(group);
      const angle = size.kind === 'angle' || size.kind === 'taper';
      const meant = reading.sheet.unit === 'in' && !angle ? size.nominal / MM_PER_INCH : size.nominal;
      if (!written) return [finding('figure', `${size.id} has no figure.`, [size.id])];
      return Math.abs(written.value - meant) > written.half * (1 + 1e-6) + 1e-9
        ? [finding('figure', `${size.id} reads ${written.value} and is ${meant.toFixed(4)}.`, [size.id])]
        : [];
    }),
};
