import { Dialog as Radix } from 'radix-ui';
import type { ReactNode } from 'react';

interface DialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  aside?: string;
  children: ReactNode;
  wide?: boolean;
}

/**
 * Two pixels of ink in a second frame. Focus stays inside, Esc leaves things as they were.
 * The ground behind it is our own element: the library's would write styles into the page, which the content policy refuses.
 */
export function Dialog({ open, onOpenChange, title, aside, children, wide }: DialogProps) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <div className="dialog-ground">
          <Radix.Content className="dialog" data-wide={wide ? '' : undefined} aria-describedby={undefined}>
            <header className="dialog-head">
              <Radix.Title className="engraved">{title}</Radix.Title>
              <span className="aside">{aside ?? 'Esc leaves it as it is'}</span>
            </header>
            <div className="dialog-body">{children}</div>
          </Radix.Content>
        </div>
      </Radix.Portal>
    </Radix.Root>
  );
}
