import type { SheetSize } from './sheet-stage';

/** The sheet in words, for somebody who hears it: the list of its sizes. */
export function SizeList({ sizes, id }: { sizes: readonly SheetSize[]; id: string }) {
  return (
    <ul id={id} className="sr-list" aria-label="Sizes on the sheet">
      {sizes.map((size) => (
        <li key={size.id}>{size.label}</li>
      ))}
    </ul>
  );
}
