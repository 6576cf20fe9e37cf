import { Link } from 'react-router-dom';
import { templates } from '../../../templates';
import { paths } from '../../lib/paths';
import { FamilyPicture } from './family-picture';

/** A shop without drawings: says what to do first, and lets it be done here. */
export function NoDrawings({ shop, mayStart }: { shop: string; mayStart: boolean }) {
  return (
    <>
      <div className="plate nothing">
        <p>
          <strong>No drawings yet.</strong>{' '}
          {mayStart
            ? 'The first takes about ten minutes: pick the family the part belongs to, type its sizes, and look at the sheet.'
            : 'A designer or the lead of this shop starts the first one.'}
        </p>
      </div>
      {mayStart && (
        <section aria-labelledby="pick-first">
          <h2 id="pick-first" className="engraved my-3">
            Pick the first family
          </h2>
          <ul className="families">
            {templates.map((template) => (
              <li key={template.id}>
                <Link className="family" to={`${paths.startDrawing(shop)}?family=${template.id}`}>
                  <FamilyPicture template={template} />
                  <strong>{template.name}</strong>
                </Link>
              </li>
            ))}
          </ul>
        </section>
      )}
    </>
  );
}
