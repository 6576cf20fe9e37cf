import type { ReactNode } from 'react';

/** CAUTION with its brass bar. */
export function CautionLine({ children }: { children: ReactNode }) {
  return (
    <p className="caution-line">
      <b>Caution</b> {children}
    </p>
  );
}

/** STOP with its lead bar. */
export function StopLine({ children }: { children: ReactNode }) {
  return (
    <p className="stop-line" role="alert">
      <b>Stop</b> {children}
    </p>
  );
}

interface SpeakingLineProps {
  head: string;
  children: ReactNode;
  act?: ReactNode;
  /** Read out when it changes. */
  live?: boolean;
}

/** A line that speaks: engraved head, a sentence, and what opens the rest of it. */
export function SpeakingLine({ head, children, act, live }: SpeakingLineProps) {
  return (
    <div className="speaking-line">
      <h2 className="engraved">{head}</h2>
      <p aria-live={live ? 'polite' : undefined}>{children}</p>
      {act}
    </div>
  );
}

/** Stands under every sheet, card and approval. */
export function StandingCaution() {
  return (
    <p className="standing-caution">
      Sizes are not checked for strength: a competent person decides whether the part may carry people, loads
      or pressure. The machine’s manual, the shop’s rules and local codes come first.
    </p>
  );
}
