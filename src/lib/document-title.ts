import { useEffect } from 'react';

/** Names the page in the window's title, the particular first: `Route, PN-0147 | Benchleaf`. */
export function useDocumentTitle(title: string): void {
  useEffect(() => {
    document.title = title ? `${title} | Benchleaf` : 'Benchleaf';
  }, [title]);
}
