/** Runs once before the server takes a request. */
export async function register(): Promise<void> {
  if (process.env['NEXT_RUNTIME'] !== 'nodejs') return;
  const { refuseUnsafeRole } = await import('./lib/db/refuse-unsafe-role');
  await refuseUnsafeRole();
}
