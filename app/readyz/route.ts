import { checkReady } from '@/lib/http/ready';

/** GET /readyz: the database answers and has the schema that this build expects. */
export const dynamic = 'force-dynamic';

export async function GET(): Promise<Response> {
  const ready = await checkReady();
  return Response.json(ready, { status: ready.ready ? 200 : 503 });
}
