import { useRouteError } from 'react-router-dom';
import { FaultBox } from '../components/fault-box';

/** What stands where a page failed: what happened, and what is safe. */
export function PageFault() {
  const fault = useRouteError();
  return (
    <main id="page" className="page" tabIndex={-1}>
      <FaultBox fault={fault instanceof Error ? fault : new Error('This page could not be shown.')} />
    </main>
  );
}
