import { useSyncExternalStore } from 'react';

const NARROW = '(max-width: 767px)';

function subscribe(listener: () => void): () => void {
  const query = matchMedia(NARROW);
  query.addEventListener('change', listener);
  return () => query.removeEventListener('change', listener);
}

/** Whether the page is folded to one hand's width. */
export function useNarrow(): boolean {
  return useSyncExternalStore(subscribe, () => matchMedia(NARROW).matches);
}
