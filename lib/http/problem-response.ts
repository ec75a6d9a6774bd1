import 'server-only';

import { AppError } from './app-error';

/** Turns whatever was thrown into problem+json (RFC 9457). What was not foreseen is logged under an id and told as nothing but that id. */
export function problemResponse(error: unknown): Response {
  const known = error instanceof AppError ? error : unforeseen(error);
  const headers = new Headers({ 'content-type': 'application/problem+json', 'cache-control': 'no-store' });
  if (known.retryAfterS) headers.set('retry-after', String(known.retryAfterS));
  const body = {
    type: `/problems/${known.code}`,
    title: known.title,
    status: known.status,
    detail: known.detail,
    problems: known.problems,
    current: known.current,
  };
  return new Response(JSON.stringify(body), { status: known.status, headers });
}

function unforeseen(error: unknown): AppError {
  const id = crypto.randomUUID();
  console.error(`unforeseen ${id}`, error);
  return new AppError({
    status: 500,
    code: 'unforeseen',
    title: 'Something went wrong here.',
    detail: `Nothing was saved. Try again; if it stays, tell whoever runs this server the number ${id}.`,
  });
}
