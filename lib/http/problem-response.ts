import 'server-only';

import { AppError } from './app-error';

/** Turns whatever was thrown into problem+json (RFC 9457). What was not foreseen is logged under an id and told as nothing but that id. */
export function problemResponse(error: unknown): Response {
  const known = error instanceof AppError ? error : isBusy(error) ? busy(error) : unforeseen(error);
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

/** SQLSTATEs that pass by themselves: serialization, deadlock, lock and statement timeouts, no connection to be had. */
const PASSING_STATES = new Set(['40001', '40P01', '55P03', '57014', '57P01', '57P02', '57P03', '53300']);
/** What the socket or the pool says, which carries no SQLSTATE. */
const PASSING_SOCKET_CODES = new Set(['ECONNREFUSED', 'ECONNRESET', 'EPIPE']);
const PASSING_WORDS =
  /^(timeout exceeded when trying to connect|Connection terminated|Client has encountered a connection error)/;

function isBusy(error: unknown): error is Error {
  if (!(error instanceof Error)) return false;
  const code = 'code' in error ? String(error.code) : '';
  if (PASSING_STATES.has(code) || PASSING_SOCKET_CODES.has(code) || code.startsWith('08')) return true;
  return PASSING_WORDS.test(error.message);
}

function busy(error: Error): AppError {
  console.error('database busy:', error.message);
  return new AppError({
    status: 503,
    code: 'busy',
    title: 'The database is busy or restarting.',
    // Not “nothing was saved”: a connection lost during COMMIT leaves that open.
    detail: 'Try again in a few seconds. What is sent twice is saved once.',
    retryAfterS: 3,
  });
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
