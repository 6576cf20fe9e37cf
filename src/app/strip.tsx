import { useState } from 'react';
import { Link, NavLink, useNavigate } from 'react-router-dom';
import { paths } from '../lib/paths';
import type { Shop } from '../lib/session';
import { useSignOut } from '../lib/session';
import { useShift } from '../lib/shift';

interface StripProps {
  person: string;
  shop: Shop | undefined;
}

/** The head of every page: plate, rooms, whose shop this is, who is here, which shift. */
export function Strip({ person, shop }: StripProps) {
  const [open, setOpen] = useState(false);
  return (
    <header className="strip">
      <Link to="/" className="plate-name" aria-label="Benchleaf, first page">
        <span>BENCHLEAF</span>
      </Link>
      <button
        type="button"
        className="button rooms-button"
        aria-expanded={open}
        aria-controls="rooms"
        onClick={() => setOpen(!open)}
      >
        Rooms
      </button>
      <div id="rooms" className="rooms" data-open={open}>
        <nav aria-label="Rooms">
          {shop && (
            <NavLink to={paths.drawings(shop.slug)} className="room" onClick={() => setOpen(false)}>
              Drawings
            </NavLink>
          )}
        </nav>
        <p className="whose">
          {shop && <span>{shop.name}</span>}
          <strong>{person}</strong>
        </p>
        <StripActs />
      </div>
    </header>
  );
}

function StripActs() {
  const [shift, chooseShift] = useShift();
  const signOut = useSignOut();
  const navigate = useNavigate();
  const leave = (everywhere: boolean) =>
    signOut.mutate({ everywhere }, { onSuccess: () => void navigate(paths.signIn()) });
  return (
    <div className="strip-acts">
      <button type="button" className="word" onClick={() => chooseShift(shift === 'night' ? 'day' : 'night')}>
        {shift === 'night' ? 'Day shift' : 'Night shift'}
      </button>
      <button type="button" className="word" disabled={signOut.isPending} onClick={() => leave(false)}>
        Sign out
      </button>
      <button
        type="button"
        className="word everywhere"
        disabled={signOut.isPending}
        onClick={() => leave(true)}
      >
        Sign out everywhere
      </button>
      {signOut.isError && <span role="alert">Not signed out: {signOut.error.message}</span>}
    </div>
  );
}
