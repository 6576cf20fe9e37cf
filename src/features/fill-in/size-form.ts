import { createContext, useContext } from 'react';
import type { Size } from '../../../shared/scheme/scheme';
import type { LengthFormat } from '../../../shared/units/format';

/** What every row of the table of sizes needs to know. */
export interface SizeForm {
  lit: string | null;
  setLit: (path: string | null) => void;
  setText: (path: string, text: string) => void;
  textOf: (path: string) => string;
  sizeOf: (path: string) => Size | undefined;
  problemOf: (path: string) => string | undefined;
  /** Figure in the sheet's unit and the limits, as the table prints them. */
  figureOf: (path: string) => string;
  limitsOf: (path: string) => string;
  editable: boolean;
  format: LengthFormat;
}

export const SizeFormContext = createContext<SizeForm | null>(null);

export function useSizeForm(): SizeForm {
  const form = useContext(SizeFormContext);
  if (!form) throw new Error('This row stands outside the table of sizes.');
  return form;
}
