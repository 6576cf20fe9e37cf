import { Outlet, useParams } from 'react-router-dom';
import { FaultBox } from '../components/fault-box';
import { Waiting } from '../components/waiting';
import { useShop } from '../lib/session';
import { useRevision } from '../revision/api/revision';
import { OpenRevisionProvider } from '../revision/open-revision';
import { RevisionHead } from './revision-head';

/** An open revision: its head with the leaves, and the leaf that is looked at. */
export function RevisionLayout() {
  const { shop: slug = '', drawing = '', revision = '' } = useParams();
  const shop = useShop(slug);
  const address = { shop: slug, drawing, revision };
  const { data, error, refetch } = useRevision(address);
  if (error && !data)
    return (
      <main id="page" tabIndex={-1}>
        <FaultBox fault={error} again={() => void refetch()} />
      </main>
    );
  if (!data || !shop)
    return (
      <main id="page" tabIndex={-1}>
        <Waiting words="Reading the drawing" rows={14} />
      </main>
    );
  // Another state is another revision to work on: nothing typed is carried from one into the other.
  return (
    <OpenRevisionProvider
      key={`${revision} ${data.revision.state}`}
      address={address}
      shop={shop}
      answer={data}
    >
      <RevisionHead />
      <Outlet />
    </OpenRevisionProvider>
  );
}
