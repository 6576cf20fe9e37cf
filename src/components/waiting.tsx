/** Bars where the words will stand; the layout keeps its lines. */
export function Waiting({ words, rows = 6 }: { words: string; rows?: number }) {
  return (
    <div className="waiting" role="status">
      <p>{words}</p>
      <div aria-hidden="true">
        {Array.from({ length: rows }, (_, row) => (
          <div key={row} className="waiting-row">
            <i />
            <i />
            <i />
          </div>
        ))}
      </div>
    </div>
  );
}
