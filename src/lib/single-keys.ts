import { useSyncExternalStore } from 'react';

const KEY = 'benchleaf.single-keys';
const listeners = new Set<() => void>();
let chosen = kept();

function kept(): boolean {
  try {
    return localStorage.getItem(KEY) !== 'off';
  } catch {
    return true;
  }
}

function choose(on: boolean): void {
  chosen = on;
  try {
    localStorage.setItem(KEY, on ? 'on' : 'off');
  } catch {
    // Not kept: it holds until the page is closed.
  }
  for (const listener of listeners) listener();
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** Whether a single letter or sign is a command; somebody who dictates or has an unsteady hand switches that off. */
export function useSingleKeys(): [boolean, (on: boolean) => void] {
  return [useSyncExternalStore(subscribe, () => chosen), choose];
}
