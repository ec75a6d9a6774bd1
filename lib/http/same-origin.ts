import 'server-only';

import { env } from '../env';
import { AppError } from './app-error';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

const elsewhere = () =>
  new AppError({
    status: 403,
    code: 'other-origin',
    title: 'This request came from another site.',
    detail: 'Open the page here and try again.',
  });

/** Both names of this machine count as one place; everything else must match the configured address exactly. */
function isHome(origin: string, request: Request): boolean {
  const home = new URL(env().NEXTAUTH_URL);
  if (origin === home.origin) return true;
  if (!URL.canParse(origin)) return false;
  const from = new URL(origin);
  const loopback = new Set(['localhost', '127.0.0.1', '[::1]']);
  if (loopback.has(home.hostname) && from.port === home.port && from.protocol === home.protocol) {
    // A phone on the home network uses this machine's own address: then the host it asked for is the host it came from.
    return loopback.has(from.hostname) || from.host === request.headers.get('host');
  }
  return false;
}

/** Refuses a changing request unless the browser says that it comes from this site. */
export function requireSameOrigin(request: Request): void {
  if (SAFE.has(request.method)) return;
  const site = request.headers.get('sec-fetch-site');
  if (site !== null && site !== 'same-origin') throw elsewhere();
  const origin = request.headers.get('origin');
  if (origin === null ? site === null : !isHome(origin, request)) throw elsewhere();
}
