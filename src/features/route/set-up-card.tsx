import { CautionLine } from '../../components/lines';
import { WithDiameters } from '../../components/diameter';
import { SetUpPictures } from '../../components/set-up-pictures';
import { STANDING_CAUTIONS } from '../../../shared/route/cautions';
import type { Operation } from '../../../shared/route/route';
import type { Size } from '../../../shared/scheme/scheme';
import type { LengthFormat } from '../../../shared/units/format';
import type { CardFacts } from '../../revision/set-up-stages';
import { feedWords, stopWords, targetWords } from './operation-words';

interface SetUpCardProps {
  card: CardFacts;
  number: number;
  sizes: ReadonlyMap<string, Size>;
  format: LengthFormat;
  /** What the shop calls the machine. */
  machine: string;
}

/** A set-up as a ruled plate: the work before and after on one datum, how it is held, and its operations. */
export function SetUpCard({ card, number, sizes, format, machine }: SetUpCardProps) {
  const { setUp, operations } = card;
  const cautions = firstTimeOnly(operations);
  const minutes = operations.reduce((sum, operation) => sum + operation.minutes, 0);
  return (
    <article className="set-up-card" id={setUp.id} aria-labelledby={`${setUp.id}-name`}>
      <header>
        <span className="card-plate">{number}</span>
        <h2 id={`${setUp.id}-name`}>
          {machine}, {setUp.holding}
        </h2>
        <span className="aside">
          {Math.round(setUp.minutes)} min to set, {Math.round(minutes)} min a piece
        </span>
      </header>
      <div className="card-top">
        <div className="card-pictures">
          <span className="aside">before</span>
          <span className="aside">after</span>
          <SetUpPictures card={card} label={`The work before and after set-up ${number}`} />
        </div>
        <dl>
          <dt className="engraved">Held</dt>
          <dd>{setUp.heldText}</dd>
          <dt className="engraved">Datum</dt>
          <dd>{setUp.datumText}</dd>
        </dl>
      </div>
      <table className="operations">
        <thead>
          <tr>
            <th scope="col" className="figure">
              no
            </th>
            <th scope="col">operation</th>
            <th scope="col" className="figure">
              stop
            </th>
            <th scope="col">target and limits</th>
            <th scope="col">tool</th>
            <th scope="col" className="figure">
              rpm
            </th>
            <th scope="col" className="figure">
              feed
            </th>
            <th scope="col">passes</th>
            <th scope="col">check with</th>
            <th scope="col">
              <span className="sr-list">done</span>
            </th>
          </tr>
        </thead>
        {operations.map((operation) => (
          <tbody key={operation.number}>
            <tr>
              <td className="figure op-number">{operation.number}</td>
              <th scope="row">{operation.title}</th>
              <td className="figure op-stop" data-word="stop">
                {stopWords(operation, format)}
              </td>
              <td className="op-target">
                <WithDiameters text={targetWords(operation, sizes, format)} />
              </td>
              <ToolCells operation={operation} format={format} />
              <td className="op-done">
                <span className="paper-square" aria-hidden="true" />
              </td>
            </tr>
            {(operation.notes ?? []).length > 0 && (
              <tr className="op-caution">
                <td />
                <td colSpan={9}>{(operation.notes ?? []).join(' ')}</td>
              </tr>
            )}
            {(cautions.get(operation.number) ?? []).map((caution) => (
              <tr key={caution} className="op-caution">
                <td />
                <td colSpan={9}>
                  <CautionLine>{caution}</CautionLine>
                </td>
              </tr>
            ))}
          </tbody>
        ))}
      </table>
      <p className="card-foot">{STANDING_CAUTIONS.join(' ')}</p>
    </article>
  );
}

/** Tool, figures and check. What has no figures gives their room to the tool, or to what it is measured with. */
function ToolCells({ operation, format }: { operation: Operation; format: LengthFormat }) {
  const { method, tool, check, speed, cut, passes } = operation;
  const checked = (
    <td className="op-check" data-word="check" colSpan={method === 'inspect' ? 5 : 1}>
      {check}
    </td>
  );
  if (method === 'inspect') return checked;
  if (speed <= 0 && !cut && passes <= 0)
    return (
      <>
        <td className="op-tool" colSpan={4}>
          {tool}
        </td>
        {checked}
      </>
    );
  return (
    <>
      <td className="op-tool">{tool}</td>
      <td className="figure op-rpm" data-word="rpm">
        {speed > 0 ? Math.round(speed) : ''}
      </td>
      <td className="figure op-feed" data-word="feed">
        {cut ? feedWords(operation, format) : ''}
      </td>
      <td className="op-passes" data-word="passes">
        {passes > 0 ? passes : ''}
      </td>
      {checked}
    </>
  );
}

/** A caution is said where it is first met on the card: said again at every line it is read no more. What always stands has its own line. */
function firstTimeOnly(operations: CardFacts['operations']): ReadonlyMap<number, readonly string[]> {
  const said = new Set(STANDING_CAUTIONS);
  return new Map(
    operations.map(({ number, cautions }) => {
      const fresh = cautions.filter((caution) => !said.has(caution));
      for (const caution of fresh) said.add(caution);
      return [number, fresh] as const;
    }),
  );
}
