import { v7 as uuid } from 'uuid';
import { Button } from '../../components/button';
import { withRowAdded } from '../../revision/draft';
import { rowNoun } from '../../revision/labels';
import { useOpenRevision } from '../../revision/open-revision';
import type { TableRows } from './field-rows';
import { useSizeForm } from './size-form';
import { StepRow } from './step-row';

/** Room for what is typed, by kind of column: a toleranced diameter and a thread need more than a length. */
const WIDTHS: Readonly<Record<string, number>> = { diameter: 118, thread: 118, length: 92 };
const USUAL_WIDTH = 90;

/** Repeating rows: added at the end, moved, removed; each keeps its hidden key, so its balloons and comments stay with it. */
export function RowTable({ table }: { table: TableRows }) {
  const { change, draft } = useOpenRevision();
  const form = useSizeForm();
  const { id, label, maximumRows, hint } = table.parameter;
  const columns = table.parameter.columns.filter(({ notYet }) => notYet === undefined);
  const noun = rowNoun(label);
  const count = table.rows.length;
  const add = () => {
    const cells = Object.fromEntries(
      table.parameter.columns.flatMap(({ id: column, default: text }) => (text ? [[column, text]] : [])),
    );
    change((before) => ({ ...before, values: withRowAdded(before.values, id, uuid().slice(0, 36), cells) }));
    window.setTimeout(
      () => document.getElementById(`field-${id}[${count}].${columns[0]?.id ?? ''}`)?.focus(),
      30,
    );
  };
  const problem = form.problemOf(id);
  const widths = columns.map(({ kind, id: column }) => WIDTHS[column] ?? WIDTHS[kind] ?? USUAL_WIDTH);
  const gridTemplateColumns = `28px ${widths.map((width) => `minmax(0, ${width}fr)`).join(' ')}`;
  return (
    <section className="row-table" aria-label={label}>
      <header className="row-table-head">
        <h3>{label}</h3>
        <span className="aside">
          {count} of at most {maximumRows}
        </span>
        {form.editable && (
          <Button size="dense" disabled={count >= maximumRows} onClick={add}>
            Add a {noun.toLowerCase()}
          </Button>
        )}
      </header>
      {problem && <p className="row-under is-wrong-text">{problem}</p>}
      {!problem && form.editable && (
        <p className="row-under">
          {hint} Press the number of a {noun.toLowerCase()} to move or remove it.
        </p>
      )}
      {count > 0 && (
        <div className="step-heads" style={{ gridTemplateColumns }} aria-hidden="true">
          <span />
          {columns.map(({ id: column, label: words }) => (
            <span key={column}>{words.toLowerCase()}</span>
          ))}
        </div>
      )}
      <ol>
        {table.rows.map((row) => (
          <StepRow
            key={row.key}
            table={table.parameter}
            row={row}
            columns={columns.map(({ id: column }) => column)}
            grid={gridTemplateColumns}
            count={count}
          />
        ))}
      </ol>
      {draft.values[id] === undefined && <p className="row-under">No rows yet.</p>}
    </section>
  );
}
