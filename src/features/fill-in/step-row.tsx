import { useState } from 'react';
import type { TableParameter } from '../../../shared/template/template';
import { Button } from '../../components/button';
import { withRowMoved, withRowRemoved } from '../../revision/draft';
import { rowNoun } from '../../revision/labels';
import { useOpenRevision } from '../../revision/open-revision';
import type { OneRow, TableRows } from './field-rows';
import { NotYetRows } from './not-yet-rows';
import { SizeInput } from './size-input';
import { useSizeForm } from './size-form';

interface StepRowProps {
  table: TableParameter;
  row: TableRows['rows'][number];
  /** Ids of the columns, in their order. */
  columns: readonly string[];
  grid: string;
  count: number;
}

/** One row of a table of rows: its number, which opens what can be done with it, and its cells. */
export function StepRow({ table, row, columns, grid, count }: StepRowProps) {
  const { change } = useOpenRevision();
  const form = useSizeForm();
  const [open, setOpen] = useState(false);
  const { id, label, minimumRows } = table;
  const noun = rowNoun(label);
  const number = row.index + 1;
  const called = `${noun.toLowerCase()} ${number}`;
  const wrong = row.cells.flatMap(({ path, parameter }) => {
    const problem = form.problemOf(path);
    return problem ? [{ path, words: `${parameter.label}: ${problem}` }] : [];
  });
  const move = (by: 1 | -1) => change((b) => ({ ...b, values: withRowMoved(b.values, id, row.index, by) }));
  return (
    <li className="step" data-open={open ? '' : undefined}>
      <div className="step-cells" style={{ gridTemplateColumns: grid }}>
        {form.editable ? (
          <button
            type="button"
            className="step-number"
            aria-expanded={open}
            aria-label={`${noun} ${number}: move or remove`}
            onClick={() => setOpen(!open)}
          >
            <span className="step-noun">{noun} </span>
            {number}
          </button>
        ) : (
          <b className="step-number">
            <span className="step-noun">{noun} </span>
            {number}
          </b>
        )}
        {row.cells.map((cell) => (
          <StepCell key={cell.path} cell={cell} column={columns.indexOf(cell.parameter.id) + 2} />
        ))}
      </div>
      {wrong.map(({ path, words }) => (
        <p key={path} id={`under-${path}`} className="step-wrong is-wrong-text">
          {words}
        </p>
      ))}
      {open && form.editable && (
        <div className="step-acts">
          <Button
            size="dense"
            disabled={row.index === 0}
            aria-label={`Move ${called} left`}
            onClick={() => move(-1)}
          >
            Move left
          </Button>
          <Button
            size="dense"
            disabled={row.index === count - 1}
            aria-label={`Move ${called} right`}
            onClick={() => move(1)}
          >
            Move right
          </Button>
          <Button
            size="dense"
            disabled={count <= minimumRows}
            aria-label={`Remove ${called}`}
            onClick={() => change((b) => ({ ...b, values: withRowRemoved(b.values, id, row.index) }))}
          >
            Remove
          </Button>
        </div>
      )}
      <NotYetRows rows={row.notYet.filter(({ path }) => form.textOf(path) !== '')} />
    </li>
  );
}

function StepCell({ cell, column }: { cell: OneRow; column: number }) {
  const form = useSizeForm();
  const { path, parameter } = cell;
  const problem = form.problemOf(path);
  const size = form.sizeOf(path);
  const figure = form.figureOf(path);
  const limits = form.limitsOf(path);
  const said = figure === '–' || figure === '' || figure === form.textOf(path).trim() || limits.includes('/');
  return (
    <div
      className="step-cell moves"
      style={{ gridColumn: column }}
      data-lit={form.lit === path ? '' : undefined}
      data-wrong={problem ? '' : undefined}
      onPointerEnter={() => size && form.setLit(path)}
      onPointerLeave={() => form.setLit(null)}
      onFocus={() => form.setLit(path)}
      onBlur={() => form.setLit(null)}
    >
      <label htmlFor={`field-${path}`}>{parameter.label}</label>
      <SizeInput path={path} parameter={parameter} describedBy={`under-${path}`} />
      <p id={problem ? undefined : `under-${path}`}>
        {size && size.balloon > 0 && <i>{size.balloon}</i>}
        {!problem && [said ? '' : figure, limits.replace(' / ', '/')].filter(Boolean).join(' ')}
      </p>
    </div>
  );
}
