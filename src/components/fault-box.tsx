import { ApiFault } from '../lib/api/fault';
import { Button } from './button';

/** What happened, and what is safe. */
export function FaultBox({ fault, again }: { fault: Error; again?: () => void }) {
  const said =
    fault instanceof ApiFault
      ? fault.message
      : 'This page met a fault of ours and could not be shown. What was kept is safe; open the page again.';
  return (
    <div className="fault-box" role="alert">
      <p>{said}</p>
      <div>
        {again ? (
          <Button onClick={again}>Ask again</Button>
        ) : (
          <Button onClick={() => window.location.reload()}>Open the page again</Button>
        )}
      </div>
    </div>
  );
}
