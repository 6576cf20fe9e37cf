import type { ReactNode } from 'react';

interface PlateProps {
  head: string;
  aside?: ReactNode;
  children: ReactNode;
  className?: string;
  /** Two pixels of ink round what decides. */
  decides?: boolean;
  level?: 2 | 3;
}

/** A ruled plate with an engraved head. */
export function Plate({ head, aside, children, className, decides, level = 2 }: PlateProps) {
  const Heading = level === 2 ? 'h2' : 'h3';
  return (
    <section className={`plate ${className ?? ''}`} data-decides={decides ? '' : undefined} aria-label={head}>
      <header className="plate-head">
        <Heading className="engraved">{head}</Heading>
        {aside !== undefined && <span className="aside">{aside}</span>}
      </header>
      {children}
    </section>
  );
}
