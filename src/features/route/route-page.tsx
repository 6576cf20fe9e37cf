import { useMemo, useState } from 'react';
import type { Register } from '../../../shared/route/register';
import type { Route } from '../../../shared/route/route';
import { formatLength, formatNumber, type LengthFormat } from '../../../shared/units/format';
import { Button } from '../../components/button';
import { StandingCaution, StopLine } from '../../components/lines';
import { Plate } from '../../components/plate';
import { Tick } from '../../components/tick';
import { Waiting } from '../../components/waiting';
import { useDocumentTitle } from '../../lib/document-title';
import { paths } from '../../lib/paths';
import { useOpenRevision } from '../../revision/open-revision';
import { itemName } from '../../revision/item-name';
import { cardsOf } from '../../revision/set-up-stages';
import { SetUpCard } from './set-up-card';
import { VerdictBox } from './verdict-box';

const UNIT_NAMES = { mm: 'millimetres', in: 'inches' } as const;

/** Columns follow the sheet's unit, sentences the unit of typing; where these differ somebody must be told. */
function unitWords(shown: 'mm' | 'in', typed: 'mm' | 'in'): string {
  if (shown === typed) return `All figures in ${UNIT_NAMES[shown]}.`;
  return `Stops, targets and feeds in ${UNIT_NAMES[shown]}; figures within sentences in ${UNIT_NAMES[typed]}.`;
}

/** The route as a works route card: read downwards, card by card. */
export function RoutePage() {
  const { good, address, answer, draft, problems, drawing, engineFault, register } = useOpenRevision();
  const { settings } = draft;
  const format = useMemo(
    () => ({ unit: settings.unit, style: settings.style }),
    [settings.unit, settings.style],
  );
  const sizes = useMemo(() => new Map((good?.scheme.sizes ?? []).map((size) => [size.id, size])), [good]);
  useDocumentTitle(`Route, ${answer.revision.drawing.number} ${draft.title}`);
  const { shop, drawing: id, revision } = address;
  const route = good?.route ?? null;
  return (
    <main id="page" className="route-page" tabIndex={-1}>
      <div className="route-bar">
        <p className="aside">
          {route
            ? `${answer.revision.drawing.number} rev ${answer.revision.letter}. ${unitWords(settings.unit, draft.entryUnit)}`
            : ''}
        </p>
        <Button disabled={!route} onClick={() => window.print()}>
          Print the card
        </Button>
      </div>
      <div className="cards">
        {problems.length > 0 && good && (
          <StopLine>A size is wrong. This is the route of the last good sizes.</StopLine>
        )}
        {good?.faults.map((fault) => (
          <StopLine key={`${fault.rule} ${fault.operation}`}>
            Operation {fault.operation}: {fault.message}
          </StopLine>
        ))}
        {!good &&
          (drawing ? (
            <Waiting words="Working out the route" rows={10} />
          ) : (
            <p className="plate empty-words">
              {engineFault ?? 'There is no route until the sizes are right.'}
            </p>
          ))}
        {good && !route && (
          <p className="plate empty-words">
            This part cannot be planned with what the shop has. The verdict says why and what would help.
          </p>
        )}
        {route &&
          cardsOf(route).map((card, index) => (
            <SetUpCard
              key={card.setUp.id}
              card={card}
              number={index + 1}
              machine={itemName(register, card.setUp.machine)}
              sizes={sizes}
              format={format}
            />
          ))}
        {route && <StandingCaution />}
      </div>
      {good && (
        <aside className="route-side" aria-label="Verdict, what to pull, time and cost">
          <VerdictBox capacity={good.capacity} allAt={paths.revision(shop, id, revision, 'capacity')} />
          {route && <PullList route={route} />}
          {route && <TimeAndCost route={route} format={format} register={register} />}
        </aside>
      )}
    </main>
  );
}

/** What to pull before starting. The ticks are for whoever stands at the drawers; they are not kept. */
function PullList({ route }: { route: Route }) {
  const [pulled, setPulled] = useState<ReadonlySet<string>>(new Set());
  const set = (item: string, on: boolean) => {
    const next = new Set(pulled);
    if (on) next.add(item);
    else next.delete(item);
    setPulled(next);
  };
  return (
    <Plate head="Pull before starting" aside={`${pulled.size} of ${route.kitting.length}`}>
      <ul className="pull-list">
        {route.kitting.map(({ item, text, place }) => (
          <li key={item}>
            <Tick label={text} checked={pulled.has(item)} onChange={(on) => set(item, on)} />
            <span className="aside">{place}</span>
          </li>
        ))}
      </ul>
    </Plate>
  );
}

function TimeAndCost({
  route,
  format,
  register,
}: {
  route: Route;
  format: LengthFormat;
  register?: Register;
}) {
  const bar = register?.bars.find(({ id }) => id === route.stock.bar);
  const { cost } = route;
  const money = (amount: number) => `${formatNumber(amount, 2, { fixed: true })} ${cost?.currency ?? ''}`;
  return (
    <Plate head="Bar, time and cost">
      <table className="ruled">
        <tbody>
          <tr>
            <th scope="row">stock</th>
            <td className="figure">
              {route.stock.shape === 'hex' ? 'hexagon' : route.stock.shape}{' '}
              {formatLength(route.stock.size, format)}
              {bar ? `, ${bar.place}` : ''}
            </td>
          </tr>
          <tr>
            <th scope="row">blank length, each</th>
            <td className="figure">
              {formatLength(route.blankLength, { ...format, decimals: format.unit === 'in' ? 3 : 1 })}
            </td>
          </tr>
          <tr>
            <th scope="row">setting</th>
            <td className="figure">{Math.round(route.minutes.setup)} min</td>
          </tr>
          <tr>
            <th scope="row">running, each</th>
            <td className="figure">{Math.round(route.minutes.run)} min</td>
          </tr>
        </tbody>
      </table>
      {cost && (
        <>
          <table className="ruled cost">
            <tbody>
              <tr>
                <th scope="row">first piece</th>
                <td className="figure">{money(cost.one)}</td>
              </tr>
              <tr>
                <th scope="row">each after</th>
                <td className="figure">{money(cost.each)}</td>
              </tr>
              <tr>
                <th scope="row">{cost.quantity} off</th>
                <td className="figure">
                  <b>{money(cost.total)}</b>
                </td>
              </tr>
            </tbody>
          </table>
          <details className="sums">
            <summary>How it adds up</summary>
            <ul>
              {cost.sums.map((sum) => (
                <li key={sum.label}>
                  <span>{sum.label}</span>
                  <b>{money(sum.amount)}</b>
                  <small>{sum.how}</small>
                </li>
              ))}
            </ul>
          </details>
        </>
      )}
    </Plate>
  );
}
