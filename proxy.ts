import { NextResponse, type NextRequest } from 'next/server';

/**
 * Headers for every page and answer. Nothing about who may do what is decided here: with this file gone, every route
 * and page still refuses the same people.
 */
const COMMON: Record<string, string> = {
  'x-content-type-options': 'nosniff',
  'referrer-policy': 'same-origin',
  'cross-origin-opener-policy': 'same-origin',
  'cross-origin-resource-policy': 'same-origin',
  'permissions-policy': 'camera=(), geolocation=(), microphone=(), payment=(), usb=()',
};

function pagePolicy(nonce: string, secure: boolean): string {
  const development = process.env.NODE_ENV === 'development';
  return [
    "default-src 'none'",
    // The development server evaluates source maps; the built one never does.
    `script-src 'nonce-${nonce}' 'strict-dynamic'${development ? " 'unsafe-eval'" : ''}`,
    `style-src 'self'${development ? " 'unsafe-inline'" : ` 'nonce-${nonce}'`}`,
    // Drawings place words by computed coordinates, which are style attributes and can carry no script.
    "style-src-attr 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    "connect-src 'self'",
    "worker-src 'self' blob:",
    "manifest-src 'self'",
    "form-action 'self'",
    "base-uri 'none'",
    "object-src 'none'",
    "frame-ancestors 'none'",
    ...(secure ? ['upgrade-insecure-requests'] : []),
  ].join('; ');
}

export function proxy(request: NextRequest): NextResponse {
  // No server action exists here; a request that names one is not ours.
  if (request.headers.has('next-action')) return new NextResponse(null, { status: 404 });
  const secure = process.env.NEXTAUTH_URL?.startsWith('https://') ?? false;
  const isApi = request.nextUrl.pathname.startsWith('/api/');
  const nonce = btoa(String.fromCharCode(...crypto.getRandomValues(new Uint8Array(16))));
  const policy = isApi ? "default-src 'none'; frame-ancestors 'none'; base-uri 'none'" : pagePolicy(nonce, secure);
  const headers = new Headers(request.headers);
  if (!isApi) {
    headers.set('x-nonce', nonce);
    headers.set('content-security-policy', policy);
  }
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  for (const [name, value] of Object.entries(COMMON)) response.headers.set(name, value);
  if (secure) response.headers.set('strict-transport-security', 'max-age=63072000; includeSubDomains');
  return response;
}

// The evaluate route takes documents of 256 kB and answers often; it sets its own headers and stays outside.
export const config = { matcher: ['/((?!_next/static|_next/image|favicon.ico|api/v1/evaluate).*)'] };
