import { useCallback, useMemo, useState } from 'react';
import { withText, textAt } from '../../revision/draft';
import { evaluatedAt, figureText, limitsText } from '../../revision/figures';
import { parameterAt } from '../../revision/labels';
import { useOpenRevision } from '../../revision/open-revision';
import type { SizeForm } from './size-form';

/** The table of sizes and the sheet, tied together: one lit path, one way to change a text. */
export function useSizeForm(): SizeForm {
  const { draft, change, editable, good, problems, result, template } = useOpenRevision();
  const [lit, setLit] = useState<string | null>(null);
  const { values, settings } = draft;
  const format = useMemo(
    () => ({ unit: settings.unit, style: settings.style }),
    [settings.unit, settings.style],
  );

  const setText = useCallback(
    (path: string, text: string) =>
      change((before) => ({
        ...before,
        ...(path === 'title' && text.trim() ? { title: text.trim() } : {}),
        values: withText(before.values, path, text),
      })),
    [change],
  );
  const sizes = useMemo(
    () =>
      new Map(
        (good?.scheme.sizes ?? []).flatMap((size) =>
          size.parameter ? [[size.parameter, size] as const] : [],
        ),
      ),
    [good],
  );
  const wrong = useMemo(
    () => new Map([...problems].reverse().map(({ path, message }) => [path, message])),
    [problems],
  );

  return useMemo(
    () => ({
      lit,
      setLit,
      setText,
      textOf: (path) => textAt(values, path),
      sizeOf: (path) => sizes.get(path),
      problemOf: (path) => wrong.get(path),
      figureOf: (path) => {
        const parameter = template && parameterAt(template, path);
        if (!parameter || wrong.has(path)) return '–';
        const size = sizes.get(path);
        const value = evaluatedAt(result, path);
        if ((!value || value.value === null || value.value === '') && size)
          return figureText({ ...parameter, kind: 'length' }, { text: '', value: size.nominal }, format);
        if (size && parameter.kind === 'thread')
          return figureText({ ...parameter, kind: 'length' }, { text: '', value: size.nominal }, format);
        return parameter.kind === 'count' ? '' : figureText(parameter, value, format);
      },
      limitsOf: (path) => {
        const size = sizes.get(path);
        return size && !wrong.has(path) ? limitsText(size, format) : '';
      },
      editable,
      format,
    }),
    [lit, setText, values, sizes, wrong, template, result, editable, format],
  );
}
