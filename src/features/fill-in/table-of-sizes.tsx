import type { KeyboardEvent } from 'react';
import { moveField } from '../../lib/keyboard';
import { useOpenRevision } from '../../revision/open-revision';
import { formRows } from './field-rows';
import { NotYetRows } from './not-yet-rows';
import { NoteRow } from './note-row';
import { RowTable } from './row-table';
import { useSizeForm } from './size-form';
import { SizeRow } from './size-row';

/** The sizes as they are typed, in the order of the family; Enter and the arrows go from one to the next. */
export function TableOfSizes() {
  const { template, draft, shown, good, answer } = useOpenRevision();
  const form = useSizeForm();
  if (!template)
    return (
      <p className="reading">
        This drawing was made with the family {answer.revision.template}, which this version does not have.
        Its sheet stands as it is stored.
      </p>
    );
  const sized = new Set(good?.scheme.sizes.flatMap(({ parameter }) => parameter ?? []));
  const { shape, sheet, notYet, notYetChoices } = formRows(template, draft.values, shown, sized);
  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    const { target } = event;
    if (!(target instanceof HTMLElement) || !target.hasAttribute('data-field')) return;
    const isText = target instanceof HTMLInputElement && target.type === 'text';
    // A note has lines of its own.
    if (target instanceof HTMLTextAreaElement) return;
    const down = (event.key === 'Enter' && !event.shiftKey) || (event.key === 'ArrowDown' && isText);
    const up = (event.key === 'ArrowUp' && isText) || (event.key === 'Enter' && event.shiftKey);
    if ((!down && !up) || target instanceof HTMLButtonElement) return;
    if (moveField(event.currentTarget, target, up ? -1 : 1)) event.preventDefault();
  };
  const filledNotYet = notYet.filter(({ path }) => form.textOf(path) !== '');
  const emptyNotYet = notYet.filter(({ path }) => form.textOf(path) === '');
  return (
    <section className="plate sizes" aria-label="Table of sizes" onKeyDown={onKeyDown}>
      <header className="size-row sizes-head">
        <h2 className="engraved">Table of sizes</h2>
        <span>as typed, {draft.entryUnit}</span>
        <span className="row-figure">{draft.settings.unit}</span>
        <span className="row-limits">limits</span>
      </header>
      {shape.map((row) =>
        row.kind === 'table' ? (
          <RowTable key={row.parameter.id} table={row} />
        ) : (
          <SizeRow key={row.path} row={row} />
        ),
      )}
      <NotYetRows rows={filledNotYet} />
      <div className="sizes-sheet">
        {sheet.map((row) => (
          <SizeRow key={row.path} row={row} />
        ))}
        <NoteRow />
      </div>
      {emptyNotYet.length + notYetChoices.length > 0 && (
        <details className="not-yet-fold">
          <summary>{emptyNotYet.length + notYetChoices.length} more that cannot be asked for yet</summary>
          <NotYetRows rows={emptyNotYet} choices={notYetChoices} />
        </details>
      )}
    </section>
  );
}
