import type { PlanAnswer } from '../../../shared/route/plan';

/** Everything of an answer that somebody reads as words: titles, holdings, notes, needs, sums, other ways, what to pull. */
export function sentencesOf({ route, capacity }: PlanAnswer): string[] {
  const said = capacity.needs.flatMap(({ need, why, alternatives }) => [need, why, ...alternatives]);
  if (!route) return said;
  return [
    ...said,
    ...route.setups.flatMap(({ holding, heldText, datumText }) => [holding, heldText, datumText]),
    ...route.operations.flatMap((o) => [o.title, o.tool, o.check, ...(o.notes ?? []), ...o.cautions]),
    ...(route.cost?.sums ?? []).flatMap(({ label, how }) => [label, how]),
    ...route.others.flatMap(({ text, why }) => [text, why]),
    ...route.kitting.flatMap(({ text, place }) => [text, place]),
  ];
}
