import { useEffect, useImperativeHandle, useLayoutEffect, useRef, type Ref } from 'react';
import type { Marked, SheetSize } from './sheet-stage';
import { SheetStage } from './sheet-stage';

export interface SheetHandle {
  whole: () => void;
  closer: () => void;
  further: () => void;
  bringIn: (sizeId: string, width: number) => void;
  placeOf: SheetStage['placeOf'];
}

interface SheetViewProps {
  svg: string;
  /** In the order of their balloons. */
  sizes: readonly SheetSize[];
  name: string;
  marked: Marked;
  onLight: (sizeId: string | null) => void;
  onEdit?: (sizeId: string) => void;
  onMoved?: () => void;
  hideSizes?: boolean;
  hideBalloons?: boolean;
  ref?: Ref<SheetHandle>;
}

/** The sheet, mounted once and kept; what it shows and what is lit follow the page. */
export function SheetView(props: SheetViewProps) {
  const { svg, sizes, name, marked, onLight, onEdit, onMoved, hideSizes, hideBalloons, ref } = props;
  const host = useRef<HTMLDivElement>(null);
  const stage = useRef<SheetStage | null>(null);
  const calls = useRef({ onLight, onEdit, onMoved });
  useLayoutEffect(() => {
    calls.current = { onLight, onEdit, onMoved };
  });
  const mayEdit = onEdit !== undefined;

  useLayoutEffect(() => {
    if (!host.current) return;
    const made = new SheetStage(host.current, {
      onLight: (id) => calls.current.onLight(id),
      onMoved: () => calls.current.onMoved?.(),
      ...(mayEdit ? { onEdit: (id: string) => calls.current.onEdit?.(id) } : {}),
    });
    stage.current = made;
    return () => {
      made.end();
      stage.current = null;
    };
  }, [mayEdit]);
  useLayoutEffect(() => stage.current?.show(svg, sizes, name), [svg, sizes, name, mayEdit]);
  useEffect(() => stage.current?.mark(marked), [marked, svg, mayEdit]);

  useImperativeHandle(ref, () => ({
    whole: () => stage.current?.whole(),
    closer: () => stage.current?.closer(),
    further: () => stage.current?.further(),
    bringIn: (id, width) => stage.current?.bringIn(id, width),
    placeOf: (id) => stage.current?.placeOf(id) ?? null,
  }));

  return (
    <div
      ref={host}
      className="sheet-host"
      data-hide-sizes={hideSizes ? '' : undefined}
      data-hide-balloons={hideBalloons ? '' : undefined}
    />
  );
}
