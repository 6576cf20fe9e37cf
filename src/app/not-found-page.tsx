import { Link } from 'react-router-dom';
import { useDocumentTitle } from '../lib/document-title';

export function NotFoundPage() {
  useDocumentTitle('No such page');
  return (
    <main id="page" className="page" tabIndex={-1}>
      <h1 className="title">No such page</h1>
      <p className="reading">
        This address leads nowhere, or to something that is not yours to see. Nothing was changed.{' '}
        <Link to="/">Go to the drawings</Link>
      </p>
    </main>
  );
}
