import type { Drawing } from '../models/drawing';
import type { Revision } from '../models/revision';
import { lastCardPicture } from './last-card-picture';
import { searchWords, threadWords } from './search-words';
import type { ShopWork } from './shop-work';

/** Keeps what the revision is found by, and marks anew which revision of its drawing each kind of reader finds. */
export async function keepFacts(work: ShopWork, drawing: Drawing, revision: Revision): Promise<void> {
  const { sequelize } = work.services.database;
  const { part, route, capacity } = revision;
  const threads = threadsOf(revision);
  const words = searchWords([revision.title, drawing.number, revision.note, ...threads].join(' '));
  await sequelize.query(
    `INSERT INTO revision_facts (shop_id, revision_id, drawing_id, words, template, state, threads, thread_names, material,
       length, max_diameter, operations, verdict, picture, changed_at)
     VALUES ($1, $2, $3, array_to_tsvector($4::text[]), $5, $6, $7, $8::text[], $9, $10, $11, $12, $13, $14, $15)
     ON CONFLICT (shop_id, revision_id) DO UPDATE SET words = excluded.words, state = excluded.state,
       threads = excluded.threads, thread_names = excluded.thread_names, material = excluded.material,
       length = excluded.length, max_diameter = excluded.max_diameter, operations = excluded.operations,
       verdict = excluded.verdict, picture = excluded.picture, changed_at = excluded.changed_at`,
    {
      bind: [
        work.shop.id,
        revision.id,
        drawing.id,
        words,
        revision.template,
        revision.state,
        // A space before each: a question finds a designation from its beginning.
        threads.map((thread) => ` ${threadWords(thread)}`).join(''),
        threads,
        part?.material ?? null,
        part?.length ?? null,
        part?.maxDiameter ?? null,
        route?.operations.length ?? null,
        capacity?.verdict ?? null,
        route ? lastCardPicture(route) : null,
        revision.changedAt,
      ],
      transaction: work.t,
    },
  );
  await markReaders(work, drawing);
}

async function markReaders(work: ShopWork, drawing: Drawing): Promise<void> {
  await work.services.database.sequelize.query(
    `WITH own AS (SELECT id, sequence, state, trial FROM revisions WHERE shop_id = $1 AND drawing_id = $2),
       published AS (SELECT id FROM own WHERE state NOT IN ('draft', 'in review') ORDER BY sequence DESC LIMIT 1),
       trial AS (SELECT id FROM own WHERE state = 'draft' AND trial),
       newest AS (SELECT id FROM own ORDER BY sequence DESC LIMIT 1)
     UPDATE revision_facts SET
       for_all = revision_id IN (SELECT id FROM published),
       for_bench = coalesce(revision_id = coalesce((SELECT id FROM trial), (SELECT id FROM published)), false),
       for_office = revision_id IN (SELECT id FROM newest)
     WHERE shop_id = $1 AND drawing_id = $2`,
    { bind: [work.shop.id, drawing.id], transaction: work.t },
  );
}

function threadsOf(revision: Revision): string[] {
  const features = revision.part?.features ?? [];
  const names = features.map((feature) => (feature.kind === 'thread' ? feature.designation : ''));
  return [...new Set(names.filter((name) => name !== ''))];
}
