import 'server-only';

import type { z } from 'zod';
import { authenticate, sessionCookieName, type Actor, type GardenActor } from '../auth/session';
import { notFoundHere, notSignedIn } from './app-error';
import { problemResponse } from './problem-response';
import { parseQuery, parseWith, readJson } from './read-request';
import { requireSameOrigin } from './same-origin';

interface Shape<P, Q, B> {
  params?: z.ZodType<P>;
  query?: z.ZodType<Q>;
  body?: z.ZodType<B>;
  /** `false`: anybody may call. `account`: signed in. `garden`: a member of the garden in the address. */
  who: 'anybody' | 'account' | 'garden';
  /** For a created row. */
  status?: 201;
}

type ActorOf<W> = W extends 'garden' ? GardenActor : W extends 'account' ? Actor : null;
type Context = { params: Promise<Record<string, string | string[] | undefined>> };

function cookieOf(request: Request): string | undefined {
  const name = `${sessionCookieName()}=`;
  const pair = request.headers
    .get('cookie')
    ?.split('; ')
    .find((each) => each.startsWith(name));
  return pair?.slice(name.length);
}

async function actorFor(
  who: Shape<unknown, unknown, unknown>['who'],
  request: Request,
  params: Record<string, unknown>,
) {
  if (who === 'anybody') return null;
  const gardenId = who === 'garden' ? String(params['gardenId']) : null;
  const found = await authenticate(cookieOf(request), gardenId);
  if (!found) throw notSignedIn();
  if (who === 'account') return found;
  // A stranger learns no more than that nothing is here.
  if (!found.role) throw notFoundHere('garden');
  return { ...found, gardenId, role: found.role };
}

/**
 * The one wrapper of every route: who is asking, what they sent, the service, and what comes back.
 *
 * Unsafe methods must come from this site. Whatever is thrown becomes problem+json; what nobody foresaw becomes a 500
 * with an id and nothing else. A service that returns a Response is answered with it as it is.
 */
export function handle<W extends 'anybody' | 'account' | 'garden', P = unknown, Q = unknown, B = unknown>(
  shape: Shape<P, Q, B> & { who: W },
  call: (input: { actor: ActorOf<W>; params: P; query: Q; body: B; request: Request }) => Promise<unknown>,
) {
  return async (request: Request, context: Context): Promise<Response> => {
    try {
      requireSameOrigin(request);
      const raw = await context.params;
      const params = parseWith(shape.params, raw, () => notFoundHere());
      const actor = (await actorFor(shape.who, request, raw)) as ActorOf<W>;
      const query = parseQuery(shape.query, request);
      const body = shape.body ? parseWith(shape.body, await readJson(request)) : (undefined as B);
      const result = await call({ actor, params, query, body, request });
      if (result instanceof Response) return result;
      if (result === undefined) return new Response(null, { status: 204 });
      return Response.json(result, { status: shape.status ?? 200, headers: { 'cache-control': 'no-store' } });
    } catch (error) {
      return problemResponse(error);
    }
  };
}
