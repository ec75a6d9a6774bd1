import { env } from '../env';

/**
 * The address that a request came from, for counting attempts.
 *
 * A forwarded address is anybody's word; it is believed only where a proxy in front is named in TRUSTED_PROXIES. Without
 * one all requests share one count, whose limit is wide enough for a household or a school.
 */
export const DIRECT = 'direct';

export function clientAddress(headers: Record<string, string | undefined>): string {
  if (env().TRUSTED_PROXIES.trim() === '') return DIRECT;
  const trusted = new Set(
    env()
      .TRUSTED_PROXIES.split(',')
      .map((each) => each.trim()),
  );
  const hops = (headers['x-forwarded-for'] ?? '')
    .split(',')
    .map((each) => each.trim())
    .filter(Boolean);
  return hops.reverse().find((hop) => !trusted.has(hop)) ?? DIRECT;
}
