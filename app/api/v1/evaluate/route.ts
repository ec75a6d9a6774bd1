import { evaluateDocument } from '@/lib/evaluation/evaluate-document';
import { invalid } from '@/lib/http/app-error';
import { handle } from '@/lib/http/handle';
import { readJson } from '@/lib/http/read-request';

/** POST /api/v1/evaluate: either document in, its result out; the same as the command to the last bit, but for the time it took. */
export const POST = handle({ who: 'anybody' }, async ({ request }) => {
  const evaluated = evaluateDocument(await readJson(request));
  if (!evaluated.ok) throw invalid(evaluated.problems);
  return evaluated.result;
});
