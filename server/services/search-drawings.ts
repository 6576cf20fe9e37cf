import { QueryTypes } from 'sequelize';
import type { z } from 'zod';
import type { searchQuery } from '../../shared/api/drawings';
import { revisionStates } from '../../shared/api/drawings';
import { Refusal } from '../errors';
import { searchWords, threadWords, wordsQuery } from './search-words';
import type { ShopWork } from './shop-work';

export interface FoundRow {
  drawingId: string;
  number: string;
  title: string;
  template: string;
  revisionId: string;
  letter: string;
  state: (typeof revisionStates)[number];
  trial: boolean;
  returned: boolean;
  version: number;
  change: string;
  changedAt: Date;
  threads: string[];
  material: string | null;
  length: number | null;
  maxDiameter: number | null;
  operations: number | null;
  verdict: 'can' | 'cannot' | 'with-changes' | null;
  picture: string | null;
}

const PUBLISHED: readonly string[] = ['released', 'superseded', 'withdrawn'];

/** Drawings that answer every term, newest change first, one row a drawing; `next` is the cursor of the rest. */
export async function searchDrawings(
  work: ShopWork,
  query: z.output<typeof searchQuery>,
): Promise<{ rows: FoundRow[]; total: number; next: string | null }> {
  const terms = termsOf(work, query);
  const { sequelize } = work.services.database;
  const [counted] = await sequelize.query<{ total: string }>(
    `SELECT count(*) AS total FROM revision_facts f WHERE ${terms.conditions.join(' AND ')}`,
    { bind: [...terms.bind], transaction: work.t, type: QueryTypes.SELECT },
  );
  const after = query.cursor === undefined ? undefined : readCursor(query.cursor);
  const conditions = [...terms.conditions];
  const bind = [...terms.bind];
  if (after) {
    conditions.push(`(f.changed_at, f.revision_id) < ($${bind.push(after.at)}, $${bind.push(after.id)})`);
  }
  const rows = await sequelize.query<FoundRow>(
    `SELECT f.drawing_id AS "drawingId", d.number, r.title, f.template, f.revision_id AS "revisionId", r.letter, r.state,
       r.trial, r.returned, r.version, r.change, f.changed_at AS "changedAt", f.thread_names AS threads, f.material,
       f.length, f.max_diameter AS "maxDiameter", f.operations, f.verdict, f.picture
     FROM revision_facts f
     JOIN drawings d ON d.shop_id = f.shop_id AND d.id = f.drawing_id
     JOIN revisions r ON r.shop_id = f.shop_id AND r.id = f.revision_id
     WHERE ${conditions.join(' AND ')}
     ORDER BY f.changed_at DESC, f.revision_id DESC LIMIT $${bind.push(query.limit + 1)}`,
    { bind, transaction: work.t, type: QueryTypes.SELECT },
  );
  const page = rows.slice(0, query.limit);
  const last = page.at(-1);
  return {
    rows: page,
    total: Number(counted?.total ?? 0),
    next: last && rows.length > query.limit ? writeCursor(last.changedAt, last.revisionId) : null,
  };
}

function termsOf(
  work: ShopWork,
  query: z.output<typeof searchQuery>,
): { conditions: string[]; bind: unknown[] } {
  const conditions: string[] = [];
  const bind: unknown[] = [];
  const add = (condition: (place: string) => string, value: unknown) => {
    conditions.push(condition(`$${bind.push(value)}`));
  };
  add((place) => `f.shop_id = ${place}`, work.shop.id);

  const states = query.state === undefined ? [] : statesOf(query.state);
  if (states.length > 0) add((place) => `f.state = ANY(${place})`, states);
  conditions.push(`f.${readerOf(work, states)}`);

  if (query.words) {
    const words = wordsQuery(query.words);
    // Something was asked, but nothing in it is a word: nothing can answer it.
    if (words === null) conditions.push('false');
    else add((place) => `f.words @@ ${place}::tsquery`, words);
  }
  if (query.thread) {
    const thread = threadWords(query.thread);
    if (searchWords(thread).length === 0) conditions.push('false');
    else add((place) => `f.threads LIKE ${place}`, `% ${thread.replace(/[\\%_]/gu, '\\$&')}%`);
  }
  if (query.material) add((place) => `f.material = ${place}`, query.material);
  if (query.template) add((place) => `f.template = ${place}`, query.template);
  if (query.lengthFrom !== undefined) add((place) => `f.length >= ${place}`, query.lengthFrom - ROUNDING);
  if (query.lengthTo !== undefined) add((place) => `f.length <= ${place}`, query.lengthTo + ROUNDING);
  if (query.diameterFrom !== undefined)
    add((place) => `f.max_diameter >= ${place}`, query.diameterFrom - ROUNDING);
  if (query.diameterTo !== undefined)
    add((place) => `f.max_diameter <= ${place}`, query.diameterTo + ROUNDING);
  return { conditions, bind };
}

/** 1/2 in asked as 12.7 must find 12.7 however its last binary digit fell (mm). */
const ROUNDING = 1e-6;

/** Which mark of the facts says that this asker finds the row. */
function readerOf(work: ShopWork, states: readonly string[]): 'for_all' | 'for_bench' | 'for_office' {
  const office = work.asker.roles.some(
    (role) => role === 'designer' || role === 'checker' || role === 'lead',
  );
  // Asked for releases alone, a drawing is found by its release, though a newer draft be open.
  if (states.length > 0 && states.every((state) => PUBLISHED.includes(state))) return 'for_all';
  if (office) return 'for_office';
  return work.asker.roles.includes('machinist') ? 'for_bench' : 'for_all';
}

function statesOf(text: string): string[] {
  const wanted = text
    .split(',')
    .map((word) => word.trim())
    .filter((word) => word !== '');
  const wrong = wanted.filter((word) => !(revisionStates as readonly string[]).includes(word));
  if (wrong.length === 0) return wanted;
  throw new Refusal('bad-input', [
    { path: 'state', message: `"${wrong[0]}" is no state. The states are ${revisionStates.join(', ')}.` },
  ]);
}

function writeCursor(at: Date, id: string): string {
  return Buffer.from(`${at.toISOString()} ${id}`).toString('base64url');
}

function readCursor(text: string): { at: Date; id: string } {
  const match =
    /^(\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z) ([0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12})$/.exec(
      Buffer.from(text, 'base64url').toString(),
    );
  const at = new Date(match?.[1] ?? '');
  if (!match?.[2] || Number.isNaN(at.getTime())) {
    throw new Refusal('bad-input', [
      { path: 'cursor', message: 'This is no place in the list. Begin at its top again.' },
    ]);
  }
  return { at, id: match[2] };
}
