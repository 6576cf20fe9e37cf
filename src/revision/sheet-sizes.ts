import type { SheetSize } from '../components/sheet/sheet-stage';
import type { Scheme, Size } from '../../shared/scheme/scheme';
import type { Template } from '../../shared/template/template';
import { formatLength, formatNumber, type LengthFormat } from '../../shared/units/format';
import { limitsText } from './figures';
import { labelOf } from './labels';

/** The sizes of a sheet in balloon order, references last, each with what a screen reader says of it. */
export function sheetSizes(
  scheme: Scheme,
  template: Template | undefined,
  format: LengthFormat,
): SheetSize[] {
  const order = (size: Size) => (size.balloon === 0 ? Number.MAX_SAFE_INTEGER : size.balloon);
  return [...scheme.sizes]
    .sort((a, b) => order(a) - order(b))
    .map((size) => ({ id: size.id, balloon: size.balloon, label: spoken(size, template, format) }));
}

function spoken(size: Size, template: Template | undefined, format: LengthFormat): string {
  const name = size.parameter ? labelOf(template, size.parameter) : size.kind;
  const figure =
    size.designation ??
    (size.kind === 'angle' ? `${formatNumber(size.nominal, 3)}°` : formatLength(size.nominal, format));
  const limits = limitsText(size, format);
  const head = size.reference ? 'Reference' : `Size ${size.balloon}`;
  return [head, name, figure, limits].filter((part) => part !== '').join(', ');
}
