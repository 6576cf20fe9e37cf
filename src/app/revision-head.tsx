import { useEffect, useRef, type KeyboardEvent } from 'react';
import { NavLink, useLocation } from 'react-router-dom';
import { Stamp } from '../components/stamp';
import { leaves, paths, type Leaf } from '../lib/paths';
import { useOpenRevision } from '../revision/open-revision';
import { KeptWords } from './kept-words';
import { SendForChecking } from './send-for-checking';
import { StaleDialog } from './stale-dialog';

const LEAF_WORDS: Readonly<Record<Leaf, string>> = {
  sizes: 'Sizes',
  route: 'Route',
  capacity: 'Can we make it?',
  'sign-off': 'Sign-off',
};

/** Longer titles are lettered smaller, so that the head keeps one line. */
const LONG_TITLE = 24;

/** Number, title, stamp, how it is kept; the leaves; the one main act. */
export function RevisionHead() {
  const { address, answer, draft, shop, keeper, editable } = useOpenRevision();
  const { revision } = answer;
  const row = useRef<HTMLElement>(null);
  const { shop: slug, drawing, revision: id } = address;
  const { pathname } = useLocation();
  // On a narrow screen the row of leaves scrolls: the one that is open is in sight.
  useEffect(() => {
    const here = row.current?.querySelector<HTMLElement>('[aria-current="page"]');
    if (here && row.current) row.current.scrollLeft = here.offsetLeft - row.current.offsetLeft - 24;
  }, [pathname]);
  const onKeyDown = (event: KeyboardEvent) => {
    const by = event.key === 'ArrowRight' ? 1 : event.key === 'ArrowLeft' ? -1 : 0;
    if (by === 0) return;
    const links = [...(row.current?.querySelectorAll('a') ?? [])];
    links[links.findIndex((link) => link === document.activeElement) + by]?.focus();
  };
  return (
    <div className="head">
      <div className="head-name">
        <h1 data-long={draft.title.length > LONG_TITLE ? '' : undefined}>
          <span>{revision.drawing.number}</span> {draft.title}
        </h1>
        <Stamp revision={revision} timeZone={shop.timeZone} />
        {editable && (
          <KeptWords keeping={keeper.keeping} timeZone={shop.timeZone} onAgain={() => void keeper.flush()} />
        )}
      </div>
      <nav ref={row} className="leaves" aria-label="Leaves of this drawing" onKeyDown={onKeyDown}>
        {leaves.map((leaf) => (
          <NavLink key={leaf} to={paths.revision(slug, drawing, id, leaf)}>
            {LEAF_WORDS[leaf]}
          </NavLink>
        ))}
      </nav>
      <SendForChecking />
      <StaleDialog />
    </div>
  );
}
