import { useEffect, useMemo, useRef, useState } from 'react';
import { Button, ButtonLink } from '../../components/button';
import { litEdges } from '../../components/sheet/lit-edges';
import { SheetView, type SheetHandle } from '../../components/sheet/sheet-view';
import { SizeList } from '../../components/sheet/size-list';
import { Tick } from '../../components/tick';
import { paths } from '../../lib/paths';
import { useOpenRevision } from '../../revision/open-revision';
import { sheetSizes } from '../../revision/sheet-sizes';
import { InPlace } from './in-place';
import { SheetSettingsPlate, settingsWords } from './sheet-settings';
import { useSizeForm } from './size-form';

/** So much of the paper, mm across, can be read at a hand's width. */
const STRIP_OF_PAPER = 130;

/** The sheet, live, with its bar; a size that is clicked is edited where it stands. */
export function SheetPlate({ follow }: { follow: boolean }) {
  const { good, draft, template, answer, address, drawing, editable, engineFault } = useOpenRevision();
  const form = useSizeForm();
  const view = useRef<SheetHandle>(null);
  const [hideSizes, setHideSizes] = useState(false);
  const [hideBalloons, setHideBalloons] = useState(false);
  const [choosing, setChoosing] = useState(false);
  const [editing, setEditing] = useState<string | null>(null);
  const [place, setPlace] = useState<ReturnType<SheetHandle['placeOf']>>(null);
  const { format, lit, sizeOf, problemOf } = form;

  const sizes = useMemo(
    () => (good ? sheetSizes(good.scheme, template, format) : []),
    [good, template, format],
  );
  const marked = useMemo(() => {
    const size = lit ? sizeOf(lit) : undefined;
    const wrong = (good?.scheme.sizes ?? []).filter(({ parameter }) => parameter && problemOf(parameter));
    return {
      lit: new Set(size ? [size.id] : []),
      wrong: new Set(wrong.map(({ id }) => id)),
      edges: size && good ? litEdges(size.anchor, good.part.body.outer, good.sheet) : [],
    };
  }, [lit, sizeOf, problemOf, good]);
  // A low sheet shows the size that is lit, else the first; a high one the whole.
  const [litId] = marked.lit;
  const firstId = sizes[0]?.id;
  const [last, setLast] = useState<string | undefined>(undefined);
  if (litId !== undefined && litId !== last) setLast(litId);
  const shownId = litId ?? last ?? firstId;
  const ready = good !== null;
  useEffect(() => {
    if (!ready) return;
    if (!follow) view.current?.whole();
    else if (shownId) view.current?.bringIn(shownId, STRIP_OF_PAPER);
  }, [follow, shownId, ready]);
  const pathOf = (sizeId: string | null) =>
    good?.scheme.sizes.find(({ id }) => id === sizeId)?.parameter ?? null;
  const edit = (sizeId: string) => {
    const path = pathOf(sizeId);
    if (!path) return;
    setPlace(view.current?.placeOf(sizeId) ?? null);
    setEditing(path);
    form.setLit(path);
  };
  const { shop, drawing: id, revision } = address;
  const name = `Sheet ${answer.revision.drawing.number} revision ${answer.revision.letter}, ${draft.title}`;

  return (
    <section className="sheet-plate" aria-label="Sheet">
      <div className="sheet-bar">
        <span className="bar-group">
          <Button size="dense" onClick={() => view.current?.whole()}>
            Whole sheet
          </Button>
          <Button size="dense" onClick={() => view.current?.closer()}>
            Closer
          </Button>
          <Button size="dense" onClick={() => view.current?.further()}>
            Further
          </Button>
        </span>
        <span className="bar-group ticks">
          <Tick label="sizes" checked={!hideSizes} onChange={(on) => setHideSizes(!on)} />
          <Tick label="balloons" checked={!hideBalloons} onChange={(on) => setHideBalloons(!on)} />
        </span>
        <span className="bar-group">
          <Button size="dense" aria-expanded={choosing} onClick={() => setChoosing(!choosing)}>
            {settingsWords(draft.settings, good?.sheet)}
            <span className="angle">, {draft.settings.style === 'iso' ? 'first' : 'third'} angle</span>
          </Button>
          <ButtonLink size="dense" to={paths.printSheet(shop, id, revision)}>
            Print
          </ButtonLink>
        </span>
      </div>
      {choosing && <SheetSettingsPlate onClose={() => setChoosing(false)} />}
      <div className="sheet-frame" data-drawing={drawing ? '' : undefined} aria-describedby="sheet-in-words">
        {good ? (
          <>
            <SheetView
              ref={view}
              svg={good.svg}
              sizes={sizes}
              name={name}
              marked={marked}
              hideSizes={hideSizes}
              hideBalloons={hideBalloons}
              onLight={(sizeId) => form.setLit(pathOf(sizeId))}
              onEdit={editable ? edit : undefined}
              onMoved={() => setEditing(null)}
            />
            <SizeList id="sheet-in-words" sizes={sizes} />
            {editing && place && (
              <InPlace
                key={editing}
                path={editing}
                place={place}
                onDone={() => {
                  setEditing(null);
                  form.setLit(null);
                }}
              />
            )}
          </>
        ) : (
          <p className="no-sheet">
            {engineFault ??
              (drawing
                ? 'Drawing the sheet'
                : 'No sheet yet. Mend the sizes marked in the table, and it is drawn here.')}
          </p>
        )}
      </div>
      <p className="sheet-words" aria-live="polite">
        {drawing && good ? 'Drawing the sheet again. The last good one stays.' : ''}
      </p>
    </section>
  );
}
