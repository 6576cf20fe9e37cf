import type { Need } from '../../../shared/route/route';

export const NEED_WORDS: Readonly<Record<Need['state'], string>> = {
  held: 'held',
  short: 'short',
  alternative: 'another way',
};

export function operationWords(operation: number): string {
  return operation === 0 ? 'the whole route' : `operation ${operation}`;
}

/** One need that wants a decision: needed, short, instead. */
export function NeedFacts({ need }: { need: Need }) {
  return (
    <div className="need-facts">
      <h3>{need.need}</h3>
      <dl>
        <dt>needed</dt>
        <dd>{operationWords(need.operation)}</dd>
        <dt>{NEED_WORDS[need.state]}</dt>
        <dd>{need.why}</dd>
        {need.alternatives.length > 0 && (
          <>
            <dt>instead</dt>
            <dd>
              {need.alternatives.map((alternative) => (
                <span key={alternative}>{alternative}</span>
              ))}
            </dd>
          </>
        )}
      </dl>
    </div>
  );
}
