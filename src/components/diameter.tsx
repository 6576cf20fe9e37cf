/** The diameter sign, drawn: the face's own is misread beside a slashed nought. */
export function Diameter({ hidden }: { hidden?: boolean }) {
  return (
    <svg
      className="dia"
      viewBox="0 0 10 10"
      {...(hidden ? { 'aria-hidden': true } : { role: 'img', 'aria-label': 'diameter' })}
    >
      <circle cx="5" cy="5" r="3.6" />
      <path d="M1 9 9 1" />
    </svg>
  );
}

/** A text in which every Ø stands as the drawn sign. */
export function WithDiameters({ text }: { text: string }) {
  const parts = text.split('Ø');
  return parts.map((part, index) => (
    <span key={index}>
      {index > 0 && <Diameter />}
      {part}
    </span>
  ));
}
