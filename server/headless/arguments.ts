import { readFile } from 'node:fs/promises';
import { parseArgs } from 'node:util';
import { z } from 'zod';
import { InputProblem } from './input-problem';
import { templates, templateById } from '../../templates';
import type { EngineRequest } from '../../shared/engine';
import type { Problem } from '../../shared/problem';
import { exampleRegister } from '../../shared/route/example-register';
import { registerSchema } from '../../shared/route/register-schema';
import type { Register } from '../../shared/route/register';
import type { TypedRow, TypedValues } from '../../shared/template/template';

const OPTIONS = [
  'params', 'register', 'quantity', 'entry-unit', 'unit', 'style', 'sheet', 'scale', 'datum', 'svg', 'pdf', 'json',
] as const; // prettier-ignore
type Option = (typeof OPTIONS)[number];

export interface Arguments {
  request: EngineRequest;
  outputs: { svg?: string; pdf?: string; json?: string };
}

/** A bare number in a parameters file means the entry unit, as if typed. */
const parametersFile = z.record(
  z.string(),
  z.union([
    z.string(),
    z.number(),
    z.boolean(),
    z.null(),
    z.array(z.record(z.string(), z.union([z.string(), z.number(), z.boolean(), z.null()]))),
  ]),
);

/**
 * The command line as an engine request.
 * @throws InputProblem with every line that is wrong.
 */
export async function readArguments(words: readonly string[]): Promise<Arguments> {
  const problems: Problem[] = [];
  const { positionals, options } = split(words, problems);
  const [templateId, ...assignments] = positionals;
  const template = templateId === undefined ? undefined : templateById(templateId);
  if (!template) {
    const known = templates.map(({ id }) => id).join(', ');
    problems.push({
      path: 'template',
      message:
        templateId === undefined
          ? `Name a template first: ${known}.`
          : `"${templateId}" is not a template. Give one of ${known}.`,
    });
  }
  const choice = <T extends string>(option: Option, allowed: readonly T[], fallback: T): T => {
    const given = options[option];
    if (given === undefined) return fallback;
    const found = allowed.find((each) => each === given);
    if (found === undefined)
      problems.push({
        path: `--${option}`,
        message: `"${given}" is not known. Give one of ${allowed.join(', ')}.`,
      });
    return found ?? fallback;
  };
  const unit = choice('unit', ['mm', 'in'], 'mm');
  const entryUnit = choice('entry-unit', ['mm', 'in'], unit);
  const style = choice('style', ['iso', 'asme'], unit === 'in' ? 'asme' : 'iso');
  const sheet = choice('sheet', ['auto', 'A4', 'A3', 'A2', 'A1', 'A', 'B', 'C', 'D'], 'auto');
  const scale = readScale(options['scale'], problems);
  const typed = await readValues(options['params'], assignments, problems);
  if (options['quantity'] !== undefined) typed['quantity'] = options['quantity'];
  const register = await readRegister(options['register'], problems);
  if (problems.length > 0 || !template) throw new InputProblem(problems);
  return {
    request: {
      template: template.id,
      typed,
      entryUnit,
      unit,
      style,
      sheet,
      scale,
      balloons: true,
      register,
      ...(options['datum'] && options['datum'] !== 'as-designed' ? { datum: options['datum'] } : {}),
      stamp: 'DRAFT: not for manufacture',
      titleBlock: {
        number: '',
        revision: '',
        drawn: null,
        checked: null,
        state: 'DRAFT',
        owner: '',
        revisions: [],
      },
    },
    outputs: { svg: options['svg'], pdf: options['pdf'], json: options['json'] },
  };
}

function split(words: readonly string[], problems: Problem[]) {
  const options: Partial<Record<Option, string>> = {};
  const { tokens } = parseArgs({
    args: [...words],
    options: Object.fromEntries(OPTIONS.map((name) => [name, { type: 'string' as const }])),
    allowPositionals: true,
    strict: false,
    tokens: true,
  });
  const positionals: string[] = [];
  for (const token of tokens) {
    if (token.kind === 'positional') positionals.push(token.value);
    if (token.kind !== 'option') continue;
    const name = OPTIONS.find((each) => each === token.name);
    if (!name)
      problems.push({
        path: token.rawName,
        message: `This option is not known. The options are --templates, ${OPTIONS.map((each) => `--${each}`).join(', ')}.`,
      });
    else if (token.value === undefined || token.value === '')
      problems.push({ path: token.rawName, message: 'This option wants a value after it.' });
    else options[name] = token.value;
  }
  return { positionals, options };
}

function readScale(text: string | undefined, problems: Problem[]): 'auto' | number {
  if (text === undefined || text === 'auto') return 'auto';
  const match = /^(\d{1,4}(?:\.\d+)?):(\d{1,4}(?:\.\d+)?)$/.exec(text);
  const paper = Number(match?.[1]);
  const real = Number(match?.[2]);
  if (match && paper > 0 && real > 0) return paper / real;
  problems.push({
    path: '--scale',
    message: `"${text}" is not a scale. Give auto or paper to real, such as 1:2 or 5:1.`,
  });
  return 'auto';
}

async function readJson(path: string, option: string, problems: Problem[]): Promise<unknown> {
  try {
    return JSON.parse(await readFile(path, 'utf8')) as unknown;
  } catch (error) {
    const why = error instanceof SyntaxError ? 'is not JSON' : 'cannot be read';
    problems.push({ path: option, message: `The file ${path} ${why}: ${(error as Error).message}.` });
    return undefined;
  }
}

async function readValues(
  path: string | undefined,
  assignments: readonly string[],
  problems: Problem[],
): Promise<TypedValues> {
  const typed: TypedValues = {};
  if (path !== undefined) {
    const content = await readJson(path, '--params', problems);
    const parsed = parametersFile.safeParse(content);
    if (parsed.success) for (const [name, value] of Object.entries(parsed.data)) typed[name] = asTyped(value);
    else if (content !== undefined) {
      for (const issue of parsed.error.issues) {
        problems.push({
          path: issue.path.join('.') || '--params',
          message: `The file gives this in a form that cannot be read: ${issue.message}.`,
        });
      }
    }
  }
  for (const assignment of assignments) {
    const equals = assignment.indexOf('=');
    if (equals < 1) {
      problems.push({ path: assignment, message: 'Give a value as name=value.' });
      continue;
    }
    const name = assignment.slice(0, equals);
    const text = assignment.slice(equals + 1);
    const table = text.startsWith('[') ? parametersFile.safeParse({ [name]: jsonOrText(text) }) : undefined;
    typed[name] = table?.success ? asTyped(table.data[name] ?? '') : text;
  }
  return typed;
}

function jsonOrText(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return text;
  }
}

function asTyped(value: z.infer<typeof parametersFile>[string]): string | TypedRow[] {
  if (!Array.isArray(value)) return scalarText(value);
  return value.map((row, index) => ({
    ...Object.fromEntries(Object.entries(row).map(([column, cell]) => [column, scalarText(cell)])),
    key: `r${index + 1}`,
  }));
}

function scalarText(value: string | number | boolean | null): string {
  if (value === null) return '';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  return String(value);
}

async function readRegister(path: string | undefined, problems: Problem[]): Promise<Register> {
  if (path === undefined) return exampleRegister;
  const content = await readJson(path, '--register', problems);
  const parsed = registerSchema.safeParse(content);
  if (parsed.success) return parsed.data;
  if (content !== undefined) {
    for (const issue of parsed.error.issues)
      problems.push({ path: `--register ${issue.path.join('.')}`, message: `${issue.message}.` });
  }
  return exampleRegister;
}
