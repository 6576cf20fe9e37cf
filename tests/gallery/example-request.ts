import type { EngineRequest } from '../../shared/engine';
import type { DraftingStyle } from '../../shared/drawing/sheet';
import { exampleRegister } from '../../shared/route/example-register';
import type { Template, TypedValues } from '../../shared/template/template';

/** A complete request for a family's worked example (or given values) with plausible records around it. */
export function exampleRequest(
  template: Template,
  style: DraftingStyle,
  unit: 'mm' | 'in',
  typed: TypedValues = template.example,
  entryUnit: 'mm' | 'in' = 'mm',
): EngineRequest {
  return {
    template: template.id,
    typed,
    entryUnit,
    unit,
    style,
    sheet: 'auto',
    scale: 'auto',
    balloons: true,
    register: exampleRegister,
    stamp: 'DRAFT: not for manufacture',
    titleBlock: {
      number: 'PN-0147',
      revision: 'B',
      drawn: { by: 'designer', date: '2026-03-07' },
      checked: null,
      state: 'DRAFT 2026-03-09',
      owner: 'Pellworth Navigation',
      revisions: [{ letter: 'A', change: 'first release', by: 'designer', date: '2024-06-17' }],
    },
  };
}
