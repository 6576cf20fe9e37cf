import type { OneRow } from './field-rows';
import { SizeInput } from './size-input';
import { useSizeForm } from './size-form';

/** Fields that cannot be used yet. One that holds something is a field to empty; the rest only say their sentence. */
export function NotYetRows({
  rows,
  choices = [],
}: {
  rows: readonly OneRow[];
  choices?: readonly { label: string; sentence: string }[];
}) {
  const form = useSizeForm();
  if (rows.length + choices.length === 0) return null;
  return (
    <div className="not-yet">
      {rows.map(({ path, parameter }) => {
        const filled = form.textOf(path) !== '';
        return (
          <div key={path} className="not-yet-row" data-wrong={filled ? '' : undefined}>
            {filled ? (
              <>
                <label htmlFor={`field-${path}`}>{parameter.label}</label>
                <SizeInput path={path} parameter={parameter} describedBy={`under-${path}`} />
              </>
            ) : (
              <b>{parameter.label}</b>
            )}
            <p id={`under-${path}`} className={filled ? 'is-wrong-text' : ''}>
              {form.problemOf(path) ?? parameter.notYet}
            </p>
          </div>
        );
      })}
      {choices.map(({ label, sentence }) => (
        <div key={label} className="not-yet-row">
          <b>{label}</b>
          <p>{sentence}</p>
        </div>
      ))}
    </div>
  );
}
