import type { Person } from './people';

type Handler = (
  request: Request,
  context: { params: Promise<Record<string, string | string[] | undefined>> },
) => Promise<Response>;

interface Call {
  /** Nobody: a stranger without a session. */
  as?: Person;
  params?: Record<string, string>;
  query?: string;
  body?: unknown;
  /** Sent as it is, where the body is to be no proper JSON. */
  text?: string;
}

/** Calls a route's handler in this process, as the person's own browser would. */
export function callRoute(handler: Handler, { as, params = {}, query = '', body, text }: Call): Promise<Response> {
  const sends = body !== undefined || text !== undefined;
  const request = new Request(`http://localhost:3000/api/v1/tested${query}`, {
    method: sends ? 'POST' : 'GET',
    headers: {
      origin: 'http://localhost:3000',
      'sec-fetch-site': 'same-origin',
      ...(as && { cookie: as.cookie }),
      ...(sends && { 'content-type': 'application/json' }),
    },
    ...(sends && { body: text ?? JSON.stringify(body) }),
  });
  return handler(request, { params: Promise.resolve(params) });
}
