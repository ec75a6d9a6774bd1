import { evaluateDocument } from '@/lib/evaluation/evaluate-document';
import { invalid } from '@/lib/http/app-error';
import { problemResponse } from '@/lib/http/problem-response';
import { readJson } from '@/lib/http/read-request';
import { requireSameOrigin } from '@/lib/http/same-origin';

/** A browser always says from which site it asks; a script need not, and has nothing here to ask for in another's name. */
const isBrowser = ({ headers }: Request) => headers.has('origin') || headers.has('sec-fetch-site');

/**
 * POST /api/v1/evaluate: either document in, its result out; the same as the command to the last bit, but for the time it took.
 *
 * It knows nobody, reads nothing and writes nothing, so anybody may ask, signed in or not, from a page of this site or from a
 * script. At most 256 kB.
 */
export async function POST(request: Request): Promise<Response> {
  try {
    if (isBrowser(request)) requireSameOrigin(request);
    const evaluated = evaluateDocument(await readJson(request));
    if (!evaluated.ok) throw invalid(evaluated.problems);
    return Response.json(evaluated.result, { headers: { 'cache-control': 'no-store' } });
  } catch (error) {
    return problemResponse(error);
  }
}
