import { v7 as uuid } from 'uuid';
import { Button } from '../../components/button';
import { withRowAdded, withRowMoved, withRowRemoved } from '../../revision/draft';
import { rowNoun } from '../../revision/labels';
import { useOpenRevision } from '../../revision/open-revision';
import type { OneRow, TableRows } from './field-rows';
import { NotYetRows } from './not-yet-rows';
import { SizeInput } from './size-input';
import { useSizeForm } from './size-form';

/** Repeating rows: added at the end, moved, removed; each keeps its hidden key, so its balloons and comments stay with it. */
export function RowTable({ table }: { table: TableRows }) {
  const { change, draft } = useOpenRevision();
  const form = useSizeForm();
  const { id, label, minimumRows, maximumRows, columns, hint } = table.parameter;
  const noun = rowNoun(label);
  const count = table.rows.length;
  const add = () => {
    const cells = Object.fromEntries(
      columns.flatMap(({ id: column, default: text }) => (text ? [[column, text]] : [])),
    );
    change((before) => ({ ...before, values: withRowAdded(before.values, id, uuid().slice(0, 36), cells) }));
    window.setTimeout(
      () => document.getElementById(`field-${id}[${count}].${columns[0]?.id ?? ''}`)?.focus(),
      30,
    );
  };
  const problem = form.problemOf(id);
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
      {(problem ?? hint) && (
        <p className={problem ? 'row-under is-wrong-text' : 'row-under'}>{problem ?? hint}</p>
      )}
      <ol>
        {table.rows.map((row) => (
          <li key={row.key} className="step">
            <div className="step-head">
              <b>
                {noun} {row.index + 1}
              </b>
              {form.editable && (
                <span className="step-acts">
                  <Button
                    size="dense"
                    disabled={row.index === 0}
                    aria-label={`Move ${noun.toLowerCase()} ${row.index + 1} left`}
                    onClick={() =>
                      change((b) => ({ ...b, values: withRowMoved(b.values, id, row.index, -1) }))
                    }
                  >
                    Left
                  </Button>
                  <Button
                    size="dense"
                    disabled={row.index === count - 1}
                    aria-label={`Move ${noun.toLowerCase()} ${row.index + 1} right`}
                    onClick={() =>
                      change((b) => ({ ...b, values: withRowMoved(b.values, id, row.index, 1) }))
                    }
                  >
                    Right
                  </Button>
                  <Button
                    size="dense"
                    disabled={count <= minimumRows}
                    aria-label={`Remove ${noun.toLowerCase()} ${row.index + 1}`}
                    onClick={() => change((b) => ({ ...b, values: withRowRemoved(b.values, id, row.index) }))}
                  >
                    Remove
                  </Button>
                </span>
              )}
            </div>
            <div className="step-cells">
              {row.cells.map((cell) => (
                <StepCell key={cell.parameter.id} cell={cell} />
              ))}
            </div>
            <NotYetRows rows={row.notYet.filter(({ path }) => form.textOf(path) !== '')} />
          </li>
        ))}
      </ol>
      {draft.values[id] === undefined && <p className="row-under">No rows yet.</p>}
    </section>
  );
}

function StepCell({ cell }: { cell: OneRow }) {
  const form = useSizeForm();
  const { path, parameter } = cell;
  const problem = form.problemOf(path);
  const size = form.sizeOf(path);
  const figure = form.figureOf(path);
  const typed = form.textOf(path);
  const figureWords = figure === '–' || figure === '' || figure === typed.trim() ? '' : figure;
  return (
    <div
      className="step-cell moves"
      data-lit={form.lit === path ? '' : undefined}
      data-wrong={problem ? '' : undefined}
      onPointerEnter={() => size && form.setLit(path)}
      onPointerLeave={() => form.setLit(null)}
      onFocus={() => form.setLit(path)}
      onBlur={() => form.setLit(null)}
    >
      <label htmlFor={`field-${path}`}>
        {size && size.balloon > 0 && <i>{size.balloon}</i>}
        {parameter.label}
      </label>
      <SizeInput path={path} parameter={parameter} describedBy={`under-${path}`} />
      <p id={`under-${path}`} className={problem ? 'is-wrong-text' : ''}>
        {problem ?? [figureWords, form.limitsOf(path)].filter(Boolean).join('  ')}
      </p>
    </div>
  );
}
