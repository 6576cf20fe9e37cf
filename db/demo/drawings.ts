import { join } from 'node:path';
import { workedExamples, defaultValues } from '../../shared/template/default-values';
import { templateById } from '../../templates';
import { usualRateLimits } from '../../server/config';
import type { Database } from '../../server/database';
import { ownThread } from '../../server/engine/job';
import { Refusal } from '../../server/errors';
import { approveRevision } from '../../server/services/approve-revision';
import { markTrial } from '../../server/services/mark-trial';
import type { RevisionAt } from '../../server/services/revision-at';
import { saveRevision } from '../../server/services/save-revision';
import type { Services } from '../../server/services/services';
import type { ShopWork } from '../../server/services/shop-work';
import { workInShop } from '../../server/services/shop-work';
import { startDrawing } from '../../server/services/start-drawing';
import { startRevision } from '../../server/services/start-revision';
import { returnRevision, submitRevision } from '../../server/services/submit-revision';
import { localDiskStore } from '../../server/storage/local-disk';

/** How far a demo drawing has come. */
type Course = 'draft' | 'trial' | 'in review' | 'returned' | 'released' | 'revised';

interface DemoDrawing {
  template: string;
  example: string;
  course: Course;
  designer: string;
  note: string;
}

const DRAWINGS: readonly DemoDrawing[] = [
  {
    template: 'tapered-handle',
    example: 'windlass-handle',
    course: 'revised',
    designer: 'designer@pellworth.example',
    note: 'Fits the windlass heads of the upper flight. Thread tried in the mate.',
  },
  {
    template: 'stepped-shaft',
    example: 'paddle-gear-shaft',
    course: 'released',
    designer: 'designer2@pellworth.example',
    note: 'Replaces the worn shaft of the ground paddle, lock 7.',
  },
  {
    template: 'stepped-shaft',
    example: 'sluice-roller-spindle',
    course: 'released',
    designer: 'designer@pellworth.example',
    note: 'Old drawing was in inches; kept so.',
  },
  {
    template: 'stepped-shaft',
    example: 'pawl-pin',
    course: 'in review',
    designer: 'designer@pellworth.example',
    note: 'Six off for the winter stoppage.',
  },
  {
    template: 'tapered-handle',
    example: 'sluice-valve-handle',
    course: 'returned',
    designer: 'designer2@pellworth.example',
    note: 'Shorter than the one at the bottom lock: the gate rail is close.',
  },
  {
    template: 'tapered-handle',
    example: 'paddle-rack-handle',
    course: 'trial',
    designer: 'designer@pellworth.example',
    note: 'Trial piece first: the rack was measured with a worn gauge.',
  },
];

const CHECKER = 'checker@pellworth.example';

/** Draws the demo drawings of that shop as its own people, through the services that serve everybody. */
export async function demoDrawings(
  database: Database,
  slug: string,
  people: ReadonlyMap<string, string>,
): Promise<void> {
  const services = seedServices(database);
  for (const drawing of DRAWINGS) {
    const as = <T>(mail: string, work: (work: ShopWork) => Promise<T>): Promise<T> => {
      const personId = people.get(mail);
      if (personId === undefined) throw new Error(`The demo shop has no ${mail}.`);
      return workInShop(services, { slug, personId }, work);
    };
    if (!(await isThere(as, drawing))) await drawAsFarAsItGoes(drawing, as);
  }
}

/** A demo drawing that the sheet check holds back stays the draft it is, and says why; that is no reason not to start. */
async function drawAsFarAsItGoes(drawing: DemoDrawing, as: As): Promise<void> {
  try {
    await draw(drawing, as);
  } catch (error) {
    if (!(error instanceof Refusal) || error.code !== 'not-ready') throw error;
  }
}

/** A first start cut short is taken up where it stopped. */
async function isThere(as: As, drawing: DemoDrawing): Promise<boolean> {
  const count = await as(drawing.designer, (work) =>
    work.services.database.models.revisions.count({
      where: { shopId: work.shop.id, note: drawing.note },
      transaction: work.t,
    }),
  );
  return count > 0;
}

type As = <T>(mail: string, work: (work: ShopWork) => Promise<T>) => Promise<T>;

async function draw(
  { template: id, example: exampleId, course, designer, note }: DemoDrawing,
  as: As,
): Promise<void> {
  const template = templateById(id);
  const example = template && workedExamples(template).find((one) => one.id === exampleId);
  if (!template || !example) throw new Error(`There is no worked example ${exampleId} of ${id}.`);
  const unit = example.entryUnit;
  const filled = {
    template: id,
    title: typeof example.values['title'] === 'string' ? example.values['title'] : example.name,
    note,
    entryUnit: unit,
    settings: {
      unit,
      style: unit === 'in' ? ('asme' as const) : ('iso' as const),
      sheet: 'auto' as const,
      scale: 'auto' as const,
      balloons: true,
    },
    values: { ...defaultValues(template, unit), ...example.values },
  };
  const started = await as(designer, (work) => startDrawing(work, filled));
  const place = placeOf(started);
  if (course === 'draft') return;
  if (course === 'trial') {
    await as(designer, (work) => markTrial(work, place, 0, true));
    return;
  }
  const sent = await as(designer, (work) => submitRevision(work, place, 0));
  if (course === 'in review') return;
  if (course === 'returned') {
    const reason = 'The thread should be one diameter longer to reach the lock nut.';
    await as(CHECKER, (work) => returnRevision(work, place, sent.revision.version, reason));
    return;
  }
  await release(as, sent);
  if (course === 'revised') await revise(as, designer, sent, filled);
}

/** A second release in place of the first: the grip a little longer, as the lock keepers asked. */
async function revise(
  as: As,
  designer: string,
  first: RevisionAt,
  filled: Parameters<typeof startDrawing>[1],
): Promise<void> {
  const next = await as(designer, (work) => startRevision(work, first.drawing.id, 'longer grip'));
  const values = { ...filled.values, gripLength: '66' };
  const { title, note, entryUnit, settings } = filled;
  const saved = await as(designer, (work) =>
    saveRevision(work, placeOf(next), { version: 0, title, note, entryUnit, settings, values }),
  );
  const sent = await as(designer, (work) => submitRevision(work, placeOf(next), saved.revision.version));
  await release(as, sent);
}

async function release(as: As, sent: RevisionAt): Promise<void> {
  const { version, contentHash } = sent.revision;
  if (contentHash === null) throw new Error('A revision was sent for checking without a content hash.');
  await as(CHECKER, (work) => approveRevision(work, placeOf(sent), { version, contentHash }));
}

function placeOf(at: RevisionAt): { drawing: string; revision: string } {
  return { drawing: at.drawing.id, revision: at.revision.id };
}

/** What drawing and deciding need; nobody signs in here. */
function seedServices(database: Database): Services {
  const storeFolder = process.env['STORE_FOLDER'] || join(process.env['BENCHLEAF_DATA'] || '.data', 'store');
  return {
    config: {
      databaseUrl: '',
      host: '',
      port: 0,
      jwtSecret: '',
      cookieSecret: '',
      storeFolder,
      clientFolder: '',
      logLevel: 'silent',
      bcryptRounds: 12,
      accessLife: 0,
      refreshLife: 0,
      refreshGrace: 0,
      rateLimits: usualRateLimits,
      secureCookies: false,
    },
    database,
    store: localDiskStore(storeFolder),
    ...ownThread,
    now: () => new Date(),
  };
}
