import { mkdir, writeFile } from 'node:fs/promises';
import { dirname } from 'node:path';
import { readArguments } from './arguments';
import { InputProblem } from './input-problem';
import { listTemplates } from './list-templates';
import { sheetPdf } from '../pdf/sheet-pdf';
import { drawResult } from '../../shared/api/contract';
import { drawResultOf } from '../../shared/draw-result';
import type { EngineResult } from '../../shared/engine';
import { runEngine } from '../../shared/engine-run';

/** Where the command's words go; the tests listen here. */
export interface Outlets {
  print: (text: string) => void;
  complain: (text: string) => void;
}

/**
 * The headless command: values in, JSON, SVG and PDF out. No database, no server.
 * @returns the exit code: 0 drawn, 2 a problem in the input (a line each), 1 a fault of ours.
 */
export async function drawCommand(words: readonly string[], { print, complain }: Outlets): Promise<number> {
  try {
    return await drawOrThrow(words, print);
  } catch (error) {
    if (error instanceof InputProblem) {
      for (const { path, message } of error.problems) complain(`${path}: ${message.replaceAll('\n', ' ')}\n`);
      return 2;
    }
    complain(
      `A fault of the program, not of the sizes: ${error instanceof Error ? error.message : String(error)}\n`,
    );
    return 1;
  }
}

async function drawOrThrow(words: readonly string[], print: (text: string) => void): Promise<number> {
  if (words.includes('--templates')) {
    print(`${JSON.stringify(listTemplates(), null, 2)}\n`);
    return 0;
  }
  const { request, outputs } = await readArguments(words);
  const result = runEngine(request);
  if (!result.good) throw new InputProblem(result.problems);

  const json = drawResult.parse(drawResultOf({ ...result, good: result.good }));
  const text = `${JSON.stringify(json, null, 2)}\n`;
  if (outputs.svg) await write(outputs.svg, result.good.svg);
  if (outputs.pdf) await write(outputs.pdf, await sheetPdf([result.good.svg], { title: titleOf(result) }));
  if (outputs.json) await write(outputs.json, text);
  if (!outputs.svg && !outputs.pdf && !outputs.json) print(text);
  return 0;
}

/** The title as drawn, which may be the family's default; a document must have one. */
function titleOf({ evaluation }: EngineResult): string {
  const title = evaluation.parameters.values['title']?.value;
  return typeof title === 'string' && title !== '' ? title : evaluation.template;
}

async function write(path: string, content: string | Uint8Array): Promise<void> {
  try {
    await mkdir(dirname(path), { recursive: true });
    await writeFile(path, content);
  } catch (error) {
    throw new InputProblem([{ path, message: `This file cannot be written: ${(error as Error).message}.` }]);
  }
}
