import type { ReactNode } from 'react';
import type { SheetSettings } from '../../../shared/api/drawings';
import type { Sheet } from '../../../shared/drawing/sheet';
import { INCH_SCALES, ISO_SCALES } from '../../../shared/standards/scales';
import { INCH_SHEETS, ISO_SHEETS } from '../../../shared/standards/sheets';
import { Button } from '../../components/button';
import { ChoiceRow } from '../../components/choice-row';
import { useOpenRevision } from '../../revision/open-revision';

/** The bar's words for a sheet: `A4, 1:1, mm`; the angle of projection follows where there is room. */
export function settingsWords(settings: SheetSettings, sheet: Sheet | undefined): string {
  const size = sheet?.size ?? (settings.sheet === 'auto' ? 'sheet' : settings.sheet);
  return [size, sheet?.scaleText, settings.unit].filter(Boolean).join(', ');
}

/** Sheet, scale, unit and drafting style. They change how the part is shown, never what it is. */
export function SheetSettingsPlate({ onClose }: { onClose: () => void }) {
  const { draft, change, editable, good } = useOpenRevision();
  const { settings } = draft;
  const set = (patch: Partial<SheetSettings>) =>
    change((before) => ({ ...before, settings: { ...before.settings, ...patch } }));
  const inch = settings.style === 'asme';
  const sheets = inch ? INCH_SHEETS : ISO_SHEETS;
  const scales = (inch ? INCH_SCALES : ISO_SCALES).filter(({ factor }) => factor <= 10 && factor >= 0.1);
  return (
    <div className="sheet-settings" role="group" aria-label="How the sheet is drawn">
      <Row label="Sheet">
        <ChoiceRow
          name="set-sheet"
          label="Sheet"
          choices={[{ id: 'auto' as const, label: 'as fits' }, ...sheets.map((id) => ({ id, label: id }))]}
          value={settings.sheet}
          disabled={!editable}
          onChange={(sheet) => set({ sheet })}
        />
      </Row>
      <Row label="Scale">
        <ChoiceRow
          name="set-scale"
          label="Scale"
          choices={[
            { id: 'auto', label: 'as fits' },
            ...scales.map(({ text, factor }) => ({ id: String(factor), label: text })),
          ]}
          value={String(settings.scale)}
          disabled={!editable}
          onChange={(scale) => set({ scale: scale === 'auto' ? 'auto' : Number(scale) })}
        />
      </Row>
      <Row label="Unit">
        <ChoiceRow
          name="set-unit"
          label="Unit of the sheet"
          choices={[
            { id: 'mm' as const, label: 'millimetres' },
            { id: 'in' as const, label: 'inches' },
          ]}
          value={settings.unit}
          disabled={!editable}
          onChange={(unit) => set({ unit })}
        />
      </Row>
      <Row label="Style">
        <ChoiceRow
          name="set-style"
          label="Drafting style"
          choices={[
            { id: 'iso' as const, label: 'ISO, first angle' },
            { id: 'asme' as const, label: 'ASME, third angle' },
          ]}
          value={settings.style}
          disabled={!editable}
          onChange={(style) => set({ style, sheet: 'auto', scale: 'auto' })}
        />
      </Row>
      <Row label="Typed in">
        <p className="typed-in">
          <b>{draft.entryUnit === 'in' ? 'inches' : 'millimetres'}</b>, as the drawing was started. The unit
          above is for showing only: if this changed with it, every figure typed without a unit would become
          another size. Type the unit with a figure, such as 1/2 in or 12 mm, to mix them.
        </p>
      </Row>
      {good && <p className="hint">{good.sheet.choice.replace(/\.?$/, '.')}</p>}
      <Button size="dense" onClick={onClose}>
        Done
      </Button>
    </div>
  );
}

function Row({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div className="setting">
      <span className="soft">{label}</span>
      {children}
    </div>
  );
}
