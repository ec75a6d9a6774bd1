import { z } from 'zod';

export const MOST_COMPARED = 8;

export const comparisonQuery = z.object({
  ids: z
    .string({ error: 'Name the scenarios to compare.' })
    .transform((text) => text.split(',').filter(Boolean))
    .pipe(
      z
        .array(z.uuid({ error: 'A scenario is named by its id.' }))
        .min(1, 'Name the scenarios to compare.')
        .max(MOST_COMPARED, `At most ${MOST_COMPARED} at once.`),
    ),
  base: z.uuid({ error: 'The baseline is named by its id.' }).optional(),
});
