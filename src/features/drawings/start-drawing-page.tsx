import { useMemo, useState, type FormEvent } from 'react';
import { useNavigate, useParams, useSearchParams } from 'react-router-dom';
import { v7 as uuid } from 'uuid';
import { limits } from '../../../shared/api/limits';
import type { RevisionAnswer } from '../../../shared/api/drawings';
import type { LengthUnit } from '../../../shared/units/length';
import { templates } from '../../../templates';
import { Button, ButtonLink } from '../../components/button';
import { ChoiceRow } from '../../components/choice-row';
import { FaultBox } from '../../components/fault-box';
import { Field } from '../../components/field';
import { Plate } from '../../components/plate';
import { Waiting } from '../../components/waiting';
import { ApiFault } from '../../lib/api/fault';
import { useDocumentTitle } from '../../lib/document-title';
import { paths } from '../../lib/paths';
import { useShop, type Shop } from '../../lib/session';
import { useRevision } from '../../revision/api/revision';
import { FamilyPicture } from './family-picture';
import { useStartDrawing } from './start-drawing';
import { beginsWith, startingSettings, startingValues } from './starting-values';

/** Starts a drawing from a family, or like one that is there. */
export function StartDrawingPage() {
  const { shop: slug = '' } = useParams();
  const shop = useShop(slug);
  const [search] = useSearchParams();
  const like = search.get('like');
  useDocumentTitle('Start a drawing');
  if (!shop) return null;
  return (
    <main id="page" className="page start" tabIndex={-1}>
      <h1 className="title">Start a drawing</h1>
      {like ? <StartLike shop={shop} like={like} /> : <StartForm shop={shop} family={search.get('family')} />}
    </main>
  );
}

function StartLike({ shop, like }: { shop: Shop; like: string }) {
  const [drawing = '', revision = ''] = like.split('/');
  const { data, error, refetch } = useRevision({ shop: shop.slug, drawing, revision });
  if (error) return <FaultBox fault={error} again={() => void refetch()} />;
  if (!data) return <Waiting words="Reading the drawing it shall be like" />;
  return <StartForm shop={shop} family={data.revision.template} like={data.revision} />;
}

interface StartFormProps {
  shop: Shop;
  family: string | null;
  like?: RevisionAnswer['revision'];
}

const UNITS: readonly { id: LengthUnit; label: string }[] = [
  { id: 'mm', label: 'millimetres' },
  { id: 'in', label: 'inches' },
];
const STYLES: readonly { id: 'iso' | 'asme'; label: string }[] = [
  { id: 'iso', label: 'ISO, first angle' },
  { id: 'asme', label: 'ASME, third angle' },
];

function StartForm({ shop, family, like }: StartFormProps) {
  const [template, setTemplate] = useState(templates.find(({ id }) => id === family) ?? templates[0]);
  const [title, setTitle] = useState(like ? like.title : '');
  const [entryUnit, setEntryUnit] = useState<LengthUnit>(like?.entryUnit ?? shop.entryUnit);
  const [style, setStyle] = useState(like?.settings.style ?? shop.style);
  const [wrong, setWrong] = useState<string | undefined>(undefined);
  const id = useMemo(() => uuid(), []);
  const navigate = useNavigate();
  const start = useStartDrawing(shop.slug);
  if (!template) return <p>There is no family to start from.</p>;

  const submit = (event: FormEvent) => {
    event.preventDefault();
    const given = title.trim();
    if (!given) {
      setWrong(`Give the part a name of 1 to ${limits.titleLength} letters, such as Windlass handle.`);
      document.getElementById('start-title')?.focus();
      return;
    }
    start.mutate(
      {
        id,
        template: template.id,
        title: given,
        entryUnit,
        settings: like ? { ...like.settings, style } : startingSettings(style, entryUnit),
        values: like ? { ...like.values, title: given } : startingValues(template, entryUnit, given),
      },
      {
        onSuccess: ({ revision }) =>
          void navigate(paths.revision(shop.slug, revision.drawing.id, revision.id), { replace: true }),
      },
    );
  };
  const titleWrong = wrong ?? fieldWords(start.error, 'title');

  return (
    <form onSubmit={submit} noValidate className="start-form">
      {like ? (
        <p className="reading">
          Like {like.drawing.number}, {like.title}: starts with the sizes of its revision {like.letter}.
          Nothing of that drawing changes.
        </p>
      ) : (
        <fieldset className="families-field">
          <legend className="engraved">Family of the part</legend>
          <div className="families">
            {templates.map((each) => (
              <label key={each.id} className="family">
                <input
                  type="radio"
                  name="family"
                  checked={each.id === template.id}
                  onChange={() => setTemplate(each)}
                />
                <FamilyPicture template={each} />
                <strong>{each.name}</strong>
                <span className="hint">{each.summary}</span>
              </label>
            ))}
          </div>
        </fieldset>
      )}
      <Plate head="The new drawing" decides className="start-plate">
        <div className="start-fields">
          <Field
            id="start-title"
            label="Title, as the sheet names the part"
            value={title}
            maxLength={limits.titleLength}
            autoComplete="off"
            onChange={(event) => {
              setTitle(event.target.value);
              setWrong(undefined);
            }}
            wrong={titleWrong}
          />
          <div className="field">
            <span className="label">A figure typed without a unit means</span>
            <ChoiceRow
              name="entry-unit"
              label="A figure typed without a unit means"
              choices={UNITS}
              value={entryUnit}
              disabled={like !== undefined}
              onChange={(unit) => {
                setEntryUnit(unit);
                setStyle(unit === 'in' ? 'asme' : 'iso');
              }}
            />
            <p className="hint">
              {like
                ? `As in ${like.drawing.number}, whose figures stay as they were typed.`
                : 'It stays so for this drawing. A figure with its unit, such as 1/2 in, is read as it says.'}
            </p>
          </div>
          <div className="field">
            <span className="label">Drafting style</span>
            <ChoiceRow
              name="style"
              label="Drafting style"
              choices={STYLES}
              value={style}
              onChange={setStyle}
            />
          </div>
          {!like && <p className="begins-with">{beginsWith(template, entryUnit)}</p>}
          {start.error && !titleWrong && (
            <p className="wrong" role="alert">
              {allWords(start.error)}
            </p>
          )}
          <div className="dialog-acts">
            <ButtonLink to={paths.drawings(shop.slug)}>Not now</ButtonLink>
            <Button type="submit" look="go" disabled={start.isPending}>
              {start.isPending ? 'Starting' : 'Start it'}
            </Button>
          </div>
        </div>
      </Plate>
    </form>
  );
}

function fieldWords(fault: Error | null, path: string): string | undefined {
  return fault instanceof ApiFault ? fault.fields.find((field) => field.path === path)?.message : undefined;
}

function allWords(fault: Error): string {
  if (!(fault instanceof ApiFault)) return fault.message;
  return [fault.message, ...fault.fields.map(({ path, message }) => `${path}: ${message}`)].join(' ');
}
