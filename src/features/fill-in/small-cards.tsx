import { Link } from 'react-router-dom';
import { Plate } from '../../components/plate';
import { SetUpPictures } from '../../components/set-up-pictures';
import { countOf } from '../../components/verdict';
import { paths } from '../../lib/paths';
import { useOpenRevision } from '../../revision/open-revision';
import { machineWord } from '../../revision/item-name';
import { cardsOf, inShort } from '../../revision/set-up-stages';

/** Drawn larger than it is shown, so that the jaws leave room for the work. */
const SMALL = { width: 270, height: 88 };

/** From bar to part: the set-ups small, pictures left, words right. */
export function SmallCards() {
  const { good, address, register } = useOpenRevision();
  const { shop, drawing, revision } = address;
  const route = good?.route;
  if (!route)
    return (
      <Plate head="From bar to part">
        <p className="empty-words">
          {good ? 'There is no route yet. Can we make it? says why.' : 'Drawn when there is a sheet.'}
        </p>
      </Plate>
    );
  const minutes = Math.round(route.minutes.setup + route.minutes.run);
  const aside = `${countOf(route.setups.length, 'set-up')}, ${countOf(route.operations.length, 'operation')}, ${minutes} min`;
  return (
    <Plate head="From bar to part" aside={aside}>
      <ol className="small-cards">
        {cardsOf(route).map((card, index) => (
          <li key={card.setUp.id}>
            <span className="card-number">{index + 1}</span>
            <SetUpPictures
              card={{ ...card, stops: undefined }}
              label={`Set-up ${index + 1}, before and after`}
              size={SMALL}
            />
            <p>
              <Link to={`${paths.revision(shop, drawing, revision, 'route')}#${card.setUp.id}`}>
                {machineWord(register, card.setUp.machine)}, {lowerFirst(card.setUp.holding)}
              </Link>
              {inShort(card.operations.filter(({ method }) => method !== 'inspect')).map((words) => (
                <span key={words}>{words}</span>
              ))}
            </p>
          </li>
        ))}
      </ol>
    </Plate>
  );
}

/** A name within a sentence; one that begins with capitals or figures keeps them. */
function lowerFirst(name: string): string {
  return /^[A-Z][a-z]/.test(name) ? name.charAt(0).toLowerCase() + name.slice(1) : name;
}
