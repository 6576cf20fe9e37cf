import { useState } from 'react';
import { limits } from '../../../shared/api/limits';
import { useOpenRevision } from '../../revision/open-revision';

/** What else somebody should know of the part: kept with the drawing, found by its words, not lettered on the sheet. */
export function NoteRow() {
  const { draft, change, editable } = useOpenRevision();
  const [here, setHere] = useState(false);
  if (!editable && draft.note === '') return null;
  return (
    <div className="size-row" data-shape="wide" onFocus={() => setHere(true)} onBlur={() => setHere(false)}>
      <span className="row-number" />
      <label className="row-name" htmlFor="field-note">
        Note
      </label>
      <textarea
        id="field-note"
        data-field=""
        className="row-input"
        rows={1}
        value={draft.note}
        readOnly={!editable}
        maxLength={limits.noteLength}
        aria-describedby={here ? 'under-note' : undefined}
        onChange={({ target: { value } }) => change((before) => ({ ...before, note: value }))}
      />
      {here && editable && (
        <p id="under-note" className="row-under">
          Kept with the drawing and found by its words. It does not stand on the sheet.
        </p>
      )}
    </div>
  );
}
