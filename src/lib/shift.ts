import { useSyncExternalStore } from 'react';

export type Shift = 'day' | 'night';

const KEY = 'benchleaf.shift';
const listeners = new Set<() => void>();

function kept(): Shift | null {
  try {
    const value = localStorage.getItem(KEY);
    return value === 'day' || value === 'night' ? value : null;
  } catch {
    return null;
  }
}

/** What the person chose, else what their machine prefers. */
export function currentShift(): Shift {
  return kept() ?? (matchMedia('(prefers-color-scheme: dark)').matches ? 'night' : 'day');
}

/** Puts the shift on the document; called once before anything is drawn and at every change. */
export function applyShift(): void {
  document.documentElement.dataset.shift = currentShift();
}

export function chooseShift(shift: Shift): void {
  try {
    localStorage.setItem(KEY, shift);
  } catch {
    // A browser that keeps nothing still changes shift, until it is closed.
  }
  document.documentElement.dataset.shift = shift;
  for (const listener of listeners) listener();
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function useShift(): [Shift, (shift: Shift) => void] {
  const shift = useSyncExternalStore(subscribe, () =>
    document.documentElement.dataset.shift === 'night' ? 'night' : 'day',
  );
  return [shift, chooseShift];
}
