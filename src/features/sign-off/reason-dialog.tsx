import { useState, type FormEvent } from 'react';
import { limits } from '../../../shared/api/limits';
import { Button } from '../../components/button';
import { Dialog } from '../../components/dialog';

interface ReasonDialogProps {
  open: boolean;
  title: string;
  says: string;
  act: string;
  onClose: () => void;
  onGiven: (reason: string) => Promise<void>;
}

/** Asks why; a reason is kept with the decision for everybody to read. */
export function ReasonDialog({ open, title, says, act, onClose, onGiven }: ReasonDialogProps) {
  const [reason, setReason] = useState('');
  const [wrong, setWrong] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const { minimum, maximum } = limits.reasonLength;
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (reason.trim().length < minimum) {
      setWrong(`Give a reason of at least ${minimum} letters, so that whoever reads it knows what to do.`);
      return;
    }
    setBusy(true);
    try {
      await onGiven(reason.trim());
      setReason('');
      onClose();
    } catch (fault) {
      setWrong(fault instanceof Error ? fault.message : 'It could not be done. Nothing was changed.');
    } finally {
      setBusy(false);
    }
  };
  return (
    <Dialog open={open} onOpenChange={(next) => !next && onClose()} title={title}>
      <form onSubmit={(event) => void submit(event)} className="grid gap-3" noValidate>
        <p>{says}</p>
        <div className="field">
          <label htmlFor="reason">Reason, at least {minimum} letters</label>
          <textarea
            id="reason"
            rows={4}
            value={reason}
            maxLength={maximum}
            aria-invalid={wrong ? true : undefined}
            aria-describedby={wrong ? 'reason-wrong' : undefined}
            onChange={(event) => {
              setReason(event.target.value);
              setWrong(null);
            }}
          />
          {wrong && (
            <p id="reason-wrong" className="wrong" role="alert">
              {wrong}
            </p>
          )}
        </div>
        <div className="dialog-acts">
          <Button onClick={onClose}>Not yet</Button>
          <Button type="submit" look="stop" disabled={busy}>
            {act}
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
