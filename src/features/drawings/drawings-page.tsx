import { useEffect, useMemo, useRef, useState } from 'react';
import { useParams, useSearchParams } from 'react-router-dom';
import { limits } from '../../../shared/api/limits';
import { revisionStates, type RevisionState } from '../../../shared/api/drawings';
import { MATERIALS } from '../../../shared/standards/materials';
import { Button, ButtonLink } from '../../components/button';
import { FaultBox } from '../../components/fault-box';
import { Tick } from '../../components/tick';
import { countOf } from '../../components/verdict';
import { Waiting } from '../../components/waiting';
import { useDocumentTitle } from '../../lib/document-title';
import { isTyping } from '../../lib/keyboard';
import { paths } from '../../lib/paths';
import { useShop } from '../../lib/session';
import { useSingleKeys } from '../../lib/single-keys';
import { readAddress, writeAddress } from './address-search';
import { Ledger } from './ledger';
import { NothingFound } from './nothing-found';
import { NoDrawings } from './no-drawings';
import { ReadAs } from './read-as';
import { useDrawings } from './search-drawings';
import { readSearchLine } from './search-line';

const PAUSE_MS = 250;

/** The shop's drawings, found by what somebody remembers of them. */
export function DrawingsPage() {
  const { shop: slug = '' } = useParams();
  const shop = useShop(slug);
  const [search, setSearch] = useSearchParams();
  const address = readAddress(search);
  const [line, setLine] = useState(address.line);
  const [singleKeys, setSingleKeys] = useSingleKeys();
  const box = useRef<HTMLInputElement>(null);
  useDocumentTitle(address.line ? `${address.line}, drawings` : 'Drawings');

  useEffect(() => {
    const wait = window.setTimeout(() => {
      if (line.trim() !== address.line) setSearch(writeAddress({ ...address, line }), { replace: true });
    }, PAUSE_MS);
    return () => window.clearTimeout(wait);
  });
  useEffect(() => {
    if (!singleKeys) return undefined;
    const toLine = (event: KeyboardEvent) => {
      if (event.key !== '/' || isTyping(event.target) || event.ctrlKey || event.metaKey || event.altKey)
        return;
      event.preventDefault();
      box.current?.focus();
    };
    window.addEventListener('keydown', toLine);
    return () => window.removeEventListener('keydown', toLine);
  }, [singleKeys]);

  const entryUnit = shop?.entryUnit ?? 'mm';
  const reading = useMemo(
    () => readSearchLine(address.line, entryUnit, MATERIALS),
    [address.line, entryUnit],
  );
  const everyState = address.states.length === revisionStates.length;
  const drawings = useDrawings(slug, {
    ...reading.query,
    ...(everyState ? {} : { state: address.states.join(',') }),
  });
  const first = drawings.data?.pages[0];
  const rows = drawings.data?.pages.flatMap((page) => page.drawings) ?? [];
  const mayStart = first?.abilities['start-drawing'] === true;
  const searching = address.line !== '' || !everyState;

  const setStates = (states: readonly RevisionState[]) =>
    setSearch(writeAddress({ line, states }), { replace: true });
  const clear = () => {
    setLine('');
    setSearch(new URLSearchParams(), { replace: true });
    box.current?.focus();
  };

  return (
    <main id="page" className="drawings" tabIndex={-1}>
      <h1 className="sr-list">Drawings</h1>
      <form
        className="search"
        role="search"
        onSubmit={(event) => {
          event.preventDefault();
          setSearch(writeAddress({ ...address, line }), { replace: true });
        }}
      >
        <input
          ref={box}
          className="search-line"
          type="text"
          aria-label="Find drawings by words, threads, sizes, material"
          placeholder="words, threads, sizes: pin M10 length 150..200"
          maxLength={limits.searchLength}
          autoComplete="off"
          spellCheck={false}
          value={line}
          onChange={(event) => setLine(event.target.value)}
          onKeyDown={(event) => {
            if (event.key !== 'ArrowDown') return;
            event.preventDefault();
            document.querySelector<HTMLElement>('.ledger a')?.focus();
          }}
        />
        {mayStart && (
          <ButtonLink to={paths.startDrawing(slug)} look="go" size="tall">
            Start a drawing
          </ButtonLink>
        )}
      </form>
      <ReadAs reading={reading} onClear={searching ? clear : undefined} />
      <div className="states">
        <fieldset>
          <legend className="engraved">State</legend>
          {revisionStates.map((state) => (
            <Tick
              key={state}
              label={state}
              checked={address.states.includes(state)}
              onChange={(on) => {
                const next = revisionStates.filter((each) =>
                  each === state ? on : address.states.includes(each),
                );
                setStates(next.length > 0 ? next : revisionStates);
              }}
            />
          ))}
        </fieldset>
        <p className="aside" aria-live="polite">
          {first ? `${countOf(first.total, 'drawing')}, newest first` : ''}
        </p>
      </div>
      {drawings.isPending && <Waiting words="Reading the drawings" />}
      {drawings.error && <FaultBox fault={drawings.error} again={() => void drawings.refetch()} />}
      {first &&
        rows.length === 0 &&
        (searching ? (
          <NothingFound reading={reading} onClear={clear} />
        ) : (
          <NoDrawings shop={slug} mayStart={mayStart} />
        ))}
      {rows.length > 0 && (
        <Ledger
          shop={slug}
          rows={rows}
          unit={entryUnit}
          timeZone={shop?.timeZone}
          mayStart={mayStart}
          singleKeys={singleKeys}
        />
      )}
      {drawings.hasNextPage && (
        <p className="more">
          <Button disabled={drawings.isFetchingNextPage} onClick={() => void drawings.fetchNextPage()}>
            {drawings.isFetchingNextPage ? 'Reading more' : 'More drawings'}
          </Button>
        </p>
      )}
      {rows.length > 0 && (
        <div className="keys">
          <span>Enter opens the marked row</span>
          {singleKeys && mayStart && <span>S starts a drawing like it</span>}
          {singleKeys && <span>/ goes to the search line</span>}
          <Tick label="single-letter keys" checked={singleKeys} onChange={setSingleKeys} />
        </div>
      )}
    </main>
  );
}
