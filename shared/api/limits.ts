/** Limits written once: used by the request schemas, the database models and the forms. */
export const limits = {
  titleLength: 80,
  noteLength: 2000,
  reasonLength: { minimum: 10, maximum: 2000 },
  valueLength: 200,
  tableRows: 20,
  parameters: 80,
  passwordLength: { minimum: 10, maximum: 72 },
  mailLength: 254,
  pageRows: { fallback: 50, maximum: 200 },
  searchLength: 200,
  quantity: 10_000,
} as const;
