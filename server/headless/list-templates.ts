import { templates } from '../../templates';
import type { Parameter, ParameterBase } from '../../shared/template/template';

/** The families and their parameters as plain JSON, for `--templates`. */
export function listTemplates() {
  return templates.map(({ id, name, summary, parameters, example }) => ({
    id,
    name,
    summary,
    parameters: parameters.map(describe),
    example,
  }));
}

function describe(parameter: Parameter): Record<string, unknown> {
  const plain = describeOne(parameter);
  return 'columns' in parameter
    ? {
        ...plain,
        minimumRows: parameter.minimumRows,
        maximumRows: parameter.maximumRows,
        columns: parameter.columns.map(describeOne),
      }
    : plain;
}

function describeOne({ id, label, kind, default: fallback, optional, choices, hint, notYet }: ParameterBase) {
  return { id, label, kind, default: fallback, optional: optional ?? false, choices, hint, notYet };
}
