import { comparisonQuery } from '@/lib/comparison/comparison.schema';
import { comparisonAsCsv } from '@/lib/comparison/comparison.service';
import { gardenParams } from '@/lib/gardens/garden.schema';
import { handle } from '@/lib/http/handle';

/** GET /api/v1/gardens/:gardenId/comparison/csv?ids=a,b&base=a: the comparison as a table. */
export const GET = handle({ who: 'garden', params: gardenParams, query: comparisonQuery }, async ({ actor, query }) => {
  const { fileName, text } = await comparisonAsCsv(actor, query);
  const headers = {
    'content-type': 'text/csv; charset=utf-8',
    'content-disposition': `attachment; filename="${fileName}"`,
    'cache-control': 'no-store',
  };
  // The mark at the beginning tells spreadsheets that the letters are UTF-8.
  return new Response(`\uFEFF${text}`, { headers });
});
