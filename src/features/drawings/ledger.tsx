import { useRef, type KeyboardEvent } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import type { DrawingRow } from '../../../shared/api/drawings';
import { materialById } from '../../../shared/standards/materials';
import { formatLength } from '../../../shared/units/format';
import type { LengthUnit } from '../../../shared/units/length';
import { templateById } from '../../../templates';
import { Diameter } from '../../components/diameter';
import { DrawnPicture } from '../../components/drawn-picture';
import { Stamp } from '../../components/stamp';
import { paths } from '../../lib/paths';

interface LedgerProps {
  shop: string;
  rows: readonly DrawingRow[];
  unit: LengthUnit;
  timeZone?: string;
  mayStart: boolean;
  /** Whether S starts a drawing like the marked row. */
  singleKeys: boolean;
}

const VERDICTS: Readonly<Record<NonNullable<DrawingRow['verdict']>, string>> = {
  can: 'yes',
  'with-changes': 'another way',
  cannot: 'no',
};

/** A stores ledger of drawings with their last set-up; arrows move from row to row. */
export function Ledger({ shop, rows, unit, timeZone, mayStart, singleKeys }: LedgerProps) {
  const table = useRef<HTMLTableElement>(null);
  const navigate = useNavigate();
  const length = (mm: number | null) => (mm === null ? '–' : formatLength(mm, { unit, style: 'iso' }));

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const links = [...(table.current?.querySelectorAll<HTMLAnchorElement>('a[data-row]') ?? [])];
    const at = links.findIndex((link) => link === document.activeElement);
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      links[at + (event.key === 'ArrowDown' ? 1 : -1)]?.focus();
    } else if (event.key.toLowerCase() === 's' && mayStart && singleKeys) {
      const row = rows[at];
      if (row) void navigate(paths.startDrawing(shop, { drawing: row.id, revision: row.revision.id }));
    }
  };

  return (
    <div className="ledger">
      <table ref={table} onKeyDown={onKeyDown}>
        <thead>
          <tr>
            <th scope="col">last set-up</th>
            <th scope="col">drawing</th>
            <th scope="col">state, rev</th>
            <th scope="col" className="figure">
              largest <Diameter />
            </th>
            <th scope="col" className="figure">
              length
            </th>
            <th scope="col">thread</th>
            <th scope="col">material</th>
            <th scope="col" className="figure">
              ops
            </th>
            <th scope="col">can make</th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.id}>
              <td className="of-picture">
                <DrawnPicture
                  svg={row.picture}
                  label={`Last set-up of ${row.title}`}
                  className="row-picture"
                />
              </td>
              <th scope="row" className="of-name">
                <span className="aside">
                  {row.number}, {(templateById(row.template)?.name ?? row.template).toLowerCase()}
                </span>
                <Link data-row="" to={paths.revision(shop, row.id, row.revision.id)}>
                  {row.title}
                </Link>
              </th>
              <td className="of-stamp">
                <Stamp revision={row.revision} timeZone={timeZone} short />
              </td>
              <td className="figure of-diameter">{length(row.maxDiameter)}</td>
              <td className="figure of-length">{length(row.length)}</td>
              <td className="of-thread">{row.threads.length > 0 ? row.threads.join(', ') : '–'}</td>
              <td className="of-material">
                {row.material ? (materialById(row.material)?.name ?? row.material) : '–'}
              </td>
              <td className="figure of-ops">{row.operations ?? '–'}</td>
              <td className="of-verdict" data-verdict={row.verdict ?? undefined}>
                {row.verdict ? VERDICTS[row.verdict] : '–'}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
