import type { EngineRequest, EngineResult } from '../../shared/engine';
import { runEngine } from '../../shared/engine-run';
import type { PdfFacts } from '../pdf/sheet-pdf';
import { sheetPdf } from '../pdf/sheet-pdf';

/** Work that takes long enough to keep others waiting: a part worked out, or sheets written as PDF. */
export type Job =
  { kind: 'engine'; request: EngineRequest } | { kind: 'pdf'; svgs: readonly string[]; facts: PdfFacts };
export type JobResult = EngineResult | Uint8Array;

/** Whoever does such work: the pool beside the server's own thread, or that thread itself in programs that serve nobody. */
export interface Bench {
  engine: (request: EngineRequest) => EngineResult | Promise<EngineResult>;
  pdf: (svgs: readonly string[], facts: PdfFacts) => Promise<Uint8Array>;
}

/** The same work on the thread that asks. */
export const ownThread: Bench = { engine: runEngine, pdf: sheetPdf };

export async function doJob(job: Job): Promise<JobResult> {
  return job.kind === 'engine' ? runEngine(job.request) : sheetPdf(job.svgs, job.facts);
}
