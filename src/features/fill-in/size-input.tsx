import { limits } from '../../../shared/api/limits';
import { MATERIALS } from '../../../shared/standards/materials';
import type { ParameterBase } from '../../../shared/template/template';
import { useSizeForm } from './size-form';

interface SizeInputProps {
  path: string;
  parameter: ParameterBase;
  describedBy?: string;
  label?: string;
}

/** What is typed at a path: a text, or a material of the table. */
export function SizeInput({ path, parameter, describedBy, label }: SizeInputProps) {
  const form = useSizeForm();
  const common = {
    id: `field-${path}`,
    'data-field': '',
    'aria-invalid': form.problemOf(path) ? true : undefined,
    'aria-describedby': describedBy,
    'aria-label': label,
    className: 'row-input moves',
  } as const;
  const text = form.textOf(path);
  if (parameter.kind === 'material') {
    const value = text || (parameter.default ?? '');
    const known = MATERIALS.some(({ id }) => id === value);
    return (
      <select
        {...common}
        value={value}
        disabled={!form.editable}
        onChange={(event) => form.setText(path, event.target.value)}
      >
        {!known && <option value={value}>{value}</option>}
        {MATERIALS.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </select>
    );
  }
  return (
    <input
      {...common}
      type="text"
      value={text}
      readOnly={!form.editable}
      maxLength={path === 'title' ? limits.titleLength : limits.valueLength}
      autoComplete="off"
      spellCheck={false}
      inputMode={parameter.kind === 'count' ? 'numeric' : undefined}
      onChange={(event) => form.setText(path, event.target.value)}
    />
  );
}
