/** True while the person types somewhere, so that a single letter is a letter and no command. */
export function isTyping(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false;
  return target.isContentEditable || ['INPUT', 'TEXTAREA', 'SELECT'].includes(target.tagName);
}

const fieldsOf = (table: HTMLElement): HTMLElement[] => [
  ...table.querySelectorAll<HTMLElement>('[data-field]'),
];

/** Moves to the next or the last field of a table; false when there is none that way. */
export function moveField(table: HTMLElement, from: Element, by: 1 | -1): boolean {
  const fields = fieldsOf(table);
  const next = fields[fields.findIndex((field) => field === from) + by];
  if (!next) return false;
  next.focus();
  if (next instanceof HTMLInputElement && next.type === 'text') next.select();
  return true;
}
