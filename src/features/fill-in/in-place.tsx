import { useEffect, useRef } from 'react';
import { labelOf } from '../../revision/labels';
import { useOpenRevision } from '../../revision/open-revision';
import { useSizeForm } from './size-form';

interface InPlaceProps {
  path: string;
  place: { left: number; top: number; width: number; height: number };
  onDone: () => void;
}

/** The same field as in the table, over its size on the sheet. Enter leaves it, Esc puts back what stood there. */
export function InPlace({ path, place, onDone }: InPlaceProps) {
  const { template } = useOpenRevision();
  const form = useSizeForm();
  const input = useRef<HTMLInputElement>(null);
  const before = useRef(form.textOf(path));
  useEffect(() => input.current?.select(), []);
  const problem = form.problemOf(path);
  const toField = () => {
    onDone();
    document.getElementById(`field-${path}`)?.focus({ preventScroll: true });
  };
  return (
    <div
      className="in-place"
      style={{ left: place.left + place.width / 2, top: place.top + place.height / 2 }}
    >
      <input
        ref={input}
        type="text"
        aria-label={labelOf(template, path)}
        aria-invalid={problem ? true : undefined}
        autoComplete="off"
        spellCheck={false}
        size={Math.max(6, form.textOf(path).length + 1)}
        value={form.textOf(path)}
        onChange={(event) => form.setText(path, event.target.value)}
        onBlur={onDone}
        onKeyDown={(event) => {
          if (event.key === 'Enter' || event.key === 'F2') toField();
          if (event.key === 'Escape') {
            form.setText(path, before.current);
            toField();
          }
          event.stopPropagation();
        }}
      />
      {problem && <p className="is-wrong-text">{problem}</p>}
    </div>
  );
}
