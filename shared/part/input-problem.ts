/** A part input that cannot be: which one, and a sentence with the allowed range in millimetres. */
export interface InputProblem {
  input: string;
  message: string;
}

/** A length in a sentence: up to three decimals, no trailing noughts. */
export function millimetres(value: number): string {
  return `${String(Math.round(value * 1000) / 1000)} mm`;
}

/** The next thousandth up: a least allowed value that is itself allowed when typed as printed. */
export function millimetresUp(value: number): string {
  return `${String(Math.ceil(value * 1000 - 1e-6) / 1000)} mm`;
}
