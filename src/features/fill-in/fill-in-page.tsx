import { useState } from 'react';
import { Notice } from '../../components/notice';
import { useNarrow } from '../../lib/narrow';
import { useDocumentTitle } from '../../lib/document-title';
import { useOpenRevision } from '../../revision/open-revision';
import { SheetLines } from './sheet-lines';
import { SheetPlate } from './sheet-plate';
import { SizeFormContext } from './size-form';
import { SmallCards } from './small-cards';
import { TableOfSizes } from './table-of-sizes';
import { useSizeForm } from './use-size-form';

const PLACES = [
  { id: 'sizes', label: 'Sizes' },
  { id: 'sheet', label: 'Whole sheet' },
  { id: 'cards', label: 'Bar to part' },
] as const;

/** Fill in a part: the table of sizes beside the live sheet. */
export function FillInPage() {
  const { answer, draft, editable, engineFault } = useOpenRevision();
  const form = useSizeForm();
  const narrow = useNarrow();
  const [place, setPlace] = useState<(typeof PLACES)[number]['id']>('sizes');
  useDocumentTitle(`Sizes, ${answer.revision.drawing.number} ${draft.title}`);
  return (
    <SizeFormContext value={form}>
      <main id="page" className="fill-in" data-place={place} tabIndex={-1}>
        <div className="places" role="group" aria-label="What is shown">
          {PLACES.map(({ id, label }) => (
            <button key={id} type="button" aria-pressed={place === id} onClick={() => setPlace(id)}>
              {label}
            </button>
          ))}
        </div>
        <div className="sizes-column">
          {!editable && <Notice>{whyNot(answer.revision.state)}</Notice>}
          {engineFault && (
            <Notice kind="wrong">The sheet could not be drawn: {engineFault} What you typed is kept.</Notice>
          )}
          <TableOfSizes />
          <SmallCards />
        </div>
        <div className="sheet-column">
          <SheetPlate follow={narrow && place !== 'sheet'} />
          <SheetLines />
        </div>
      </main>
    </SizeFormContext>
  );
}

function whyNot(state: string): string {
  if (state === 'draft') return 'This draft is for its designers to fill in; you may read it.';
  if (state === 'in review')
    return 'In review: nothing changes until it is approved, returned or taken back.';
  return `A ${state} revision does not change. What is shown is what was stored.`;
}
