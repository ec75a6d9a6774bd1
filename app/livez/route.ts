/** GET /livez: the process answers; nothing else is touched. */
export const dynamic = 'force-dynamic';

export function GET(): Response {
  return Response.json({ live: true });
}
