import { config } from 'zod';
import { profilePicture } from '../../shared/drawing/picture';
import { runEngine } from '../../shared/engine-run';
import { renderPicture } from '../../shared/render/svg';
import { evaluate } from '../../shared/template/evaluate';
import { exampleValues } from '../../shared/template/default-values';
import { templateById } from '../../templates';
import type { WorkerAnswer, WorkerRequest } from './messages';
import { shownPaths } from './shown-paths';

// The content policy forbids code made from text, which zod would otherwise try.
config({ jitless: true });

self.onmessage = (event: MessageEvent<WorkerRequest>) => {
  self.postMessage(answer(event.data));
};

function answer(asked: WorkerRequest): WorkerAnswer {
  const { ticket } = asked;
  try {
    if (asked.kind === 'picture') return { kind: 'picture', ticket, svg: templatePicture(asked.template) };
    const result = runEngine(asked.request);
    return { kind: 'drawn', ticket, result, shown: shownPaths(result) };
  } catch (fault) {
    return { kind: 'fault', ticket, message: fault instanceof Error ? fault.message : 'The engine failed.' };
  }
}

/** The finished profile of a family's worked example. */
function templatePicture(id: string): string {
  const template = templateById(id);
  if (!template) throw new Error(`There is no family "${id}".`);
  const { part } = evaluate(template, exampleValues(template), { entryUnit: 'mm' });
  if (!part) throw new Error(`The worked example of "${id}" is not a part.`);
  return renderPicture(profilePicture(part.body, { width: 280, height: 110 }));
}
