import { useState } from 'react';
import { ChoiceRow } from '../../components/choice-row';
import { offeredChoices, type OneRow } from './field-rows';
import { SizeInput } from './size-input';
import { useSizeForm } from './size-form';

const YES_NO = [
  { id: 'yes', label: 'yes' },
  { id: 'no', label: 'no' },
] as const;

/** Longer names are lettered smaller, so that every row keeps one line. */
const LONG_NAME = 15;

/** One row of the table of sizes: number, name, as typed, figure, limits; a wrong one with its sentence under it. */
export function SizeRow({ row }: { row: OneRow }) {
  const form = useSizeForm();
  const [here, setHere] = useState(false);
  const { path, parameter } = row;
  const problem = form.problemOf(path);
  const size = form.sizeOf(path);
  const isChoice = parameter.kind === 'choice' || parameter.kind === 'yes-no';
  const isWide = parameter.kind === 'text' || parameter.kind === 'material';
  const under = problem ?? (here && !isChoice ? parameter.hint : undefined);
  const shape = isChoice ? 'choice' : isWide ? 'wide' : 'size';
  return (
    <div
      className="size-row moves"
      data-shape={shape}
      data-lit={form.lit === path ? '' : undefined}
      data-wrong={problem ? '' : undefined}
      onPointerEnter={() => size && form.setLit(path)}
      onPointerLeave={() => form.setLit(null)}
      onFocus={() => {
        setHere(true);
        form.setLit(path);
      }}
      onBlur={() => {
        setHere(false);
        form.setLit(null);
      }}
    >
      <span className="row-number">{size && size.balloon > 0 ? size.balloon : ''}</span>
      {isChoice ? (
        <span className="row-name">{parameter.label}</span>
      ) : (
        <label
          className="row-name"
          data-long={parameter.label.length > LONG_NAME ? '' : undefined}
          htmlFor={`field-${path}`}
        >
          {parameter.label}
          <small className="limits-under">{form.limitsOf(path)}</small>
        </label>
      )}
      {isChoice ? (
        <ChoiceRow
          name={path}
          label={parameter.label}
          choices={parameter.kind === 'yes-no' ? YES_NO : offeredChoices(parameter, form.textOf(path))}
          value={form.textOf(path) || (parameter.default ?? '')}
          onChange={(id) => form.setText(path, id)}
          disabled={!form.editable}
          inTable
          describedBy={under ? `under-${path}` : undefined}
        />
      ) : (
        <SizeInput path={path} parameter={parameter} describedBy={under ? `under-${path}` : undefined} />
      )}
      {shape === 'size' && (
        <>
          <span className="row-figure">{form.figureOf(path)}</span>
          <span className="row-limits">{form.limitsOf(path)}</span>
        </>
      )}
      {under && (
        <p id={`under-${path}`} className={problem ? 'row-under is-wrong-text' : 'row-under'}>
          {under}
        </p>
      )}
    </div>
  );
}
