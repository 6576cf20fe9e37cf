import { z } from 'zod';

/** GET …/sheet.pdf: with `card=true` the route card follows the sheet. */
export const pdfQuery = z.object({
  card: z
    .enum(['true', 'false'])
    .default('false')
    .transform((word) => word === 'true'),
});
