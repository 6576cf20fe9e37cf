import type { Draft } from './draft';

interface Held {
  /** The version it was typed on. */
  version: number;
  draft: Draft;
}

const keyOf = (revision: string) => `benchleaf.held.${revision}`;

/** Keeps what is not yet on the server in this browser, so that neither a lost connection nor a closed page loses it. */
export function holdDraft(revision: string, held: Held): void {
  try {
    localStorage.setItem(keyOf(revision), JSON.stringify(held));
  } catch {
    // No room or not allowed: the page itself still holds it.
  }
}

export function releaseDraft(revision: string): void {
  try {
    localStorage.removeItem(keyOf(revision));
  } catch {
    // As above.
  }
}

export function heldDraft(revision: string): Held | null {
  try {
    const text = localStorage.getItem(keyOf(revision));
    if (!text) return null;
    const held: unknown = JSON.parse(text);
    return isHeld(held) ? held : null;
  } catch {
    return null;
  }
}

function isHeld(held: unknown): held is Held {
  if (typeof held !== 'object' || held === null || !('version' in held) || !('draft' in held)) return false;
  const { version, draft } = held;
  return (
    typeof version === 'number' &&
    typeof draft === 'object' &&
    draft !== null &&
    'values' in draft &&
    'settings' in draft &&
    'title' in draft
  );
}
