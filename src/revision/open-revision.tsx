import {
  createContext,
  useCallback,
  useContext,
  useEffect,
  useMemo,
  useRef,
  useState,
  type ReactNode,
} from 'react';
import type { RevisionAnswer } from '../../shared/api/drawings';
import type { EngineGood, EngineResult } from '../../shared/engine';
import type { Register } from '../../shared/route/register';
import type { Problem } from '../../shared/problem';
import type { Template } from '../../shared/template/template';
import { templateById } from '../../templates';
import { useEngine } from '../engine/use-engine';
import type { Shop } from '../lib/session';
import { useRegister } from './api/register';
import type { RevisionAddress } from './api/revision';
import { draftOf, type Draft } from './draft';
import { engineRequest, sheetFacts, type SheetFacts } from './engine-request';
import { heldDraft } from './held-draft';
import { storedGood } from './stored-result';
import { useKeeping, type Keeper } from './use-keeping';

/** A revision that is open on the bench: what is typed, what the engine makes of it, how it is kept. */
export interface OpenRevision {
  address: RevisionAddress;
  shop: Shop;
  answer: RevisionAnswer;
  template: Template | undefined;
  draft: Draft;
  editable: boolean;
  change: (change: (draft: Draft) => Draft) => void;
  replace: (draft: Draft) => void;
  keeper: Keeper;
  /** Newest judgement of what is typed; null for a revision that is shown as stored. */
  result: EngineResult | null;
  problems: readonly Problem[];
  /** Last good sheet and route: live for a draft, as stored for everything else. */
  good: EngineGood | null;
  /** Paths of the fields these values show; null until the engine has said. */
  shown: readonly string[] | null;
  drawing: boolean;
  /** What the shop owns, once it is read. */
  register: Register | undefined;
  engineFault: string | null;
}

const Context = createContext<OpenRevision | null>(null);

export function useOpenRevision(): OpenRevision {
  const open = useContext(Context);
  if (!open) throw new Error('No revision is open here.');
  return open;
}

interface ProviderProps {
  address: RevisionAddress;
  shop: Shop;
  answer: RevisionAnswer;
  children: ReactNode;
}

/** What this browser still holds of an earlier visit goes before what the server sent. */
function firstDraft(answer: RevisionAnswer, editable: boolean): { draft: Draft; restored: boolean } {
  const held = editable ? heldDraft(answer.revision.id) : null;
  return held ? { draft: held.draft, restored: true } : { draft: draftOf(answer), restored: false };
}

export function OpenRevisionProvider({ address, shop, answer, children }: ProviderProps) {
  const editable = answer.abilities['edit'] === true;
  const [first] = useState(() => firstDraft(answer, editable));
  const [draft, setDraft] = useState(first.draft);
  const keeper = useKeeping(address, answer);
  const register = useRegister(address.shop);
  const { typed } = keeper;
  const restored = useRef(first.restored);

  useEffect(() => {
    if (!restored.current) return;
    restored.current = false;
    typed(first.draft);
  }, [first, typed]);

  // Ahead of the next drawing of the page: two changes in one turn both count.
  const latest = useRef(first.draft);
  const replace = useCallback(
    (next: Draft) => {
      latest.current = next;
      setDraft(next);
      typed(next);
    },
    [typed],
  );
  const change = useCallback(
    (alter: (draft: Draft) => Draft) => {
      if (editable) replace(alter(latest.current));
    },
    [editable, replace],
  );

  const live = answer.revision.state === 'draft';
  // The answer is a new object after every save; only what the sheet prints of it may draw the sheet again.
  const facts = JSON.stringify(sheetFacts(answer, shop));
  const { values, settings, entryUnit } = draft;
  const request = useMemo(
    () =>
      register.data
        ? engineRequest(JSON.parse(facts) as SheetFacts, { values, settings, entryUnit }, register.data)
        : null,
    [facts, values, settings, entryUnit, register.data],
  );
  const engine = useEngine(request);
  const stored = useMemo(() => storedGood(answer), [answer]);

  const value: OpenRevision = {
    address,
    shop,
    answer,
    template: templateById(answer.revision.template),
    draft,
    editable,
    change,
    replace,
    keeper,
    result: live ? engine.result : null,
    problems: live ? (engine.result?.problems ?? answer.revision.problems) : [],
    good: live ? (engine.good ?? stored) : stored,
    shown: engine.shown,
    drawing: live && engine.drawing,
    register: register.data,
    engineFault: live ? (register.error?.message ?? engine.fault) : null,
  };
  return <Context.Provider value={value}>{children}</Context.Provider>;
}
