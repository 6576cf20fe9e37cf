import type { ReactNode } from 'react';

/** Ruled and in place; never floats over the sheet. */
export function Notice({
  children,
  kind = 'plain',
}: {
  children: ReactNode;
  kind?: 'plain' | 'away' | 'wrong';
}) {
  return (
    <div className="notice" data-kind={kind} role={kind === 'wrong' ? 'alert' : 'status'}>
      {children}
    </div>
  );
}
