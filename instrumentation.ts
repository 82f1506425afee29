/** Called once when the server starts: an incomplete environment is named before any request. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { checkEnvironment } = await import('@/lib/env');
  checkEnvironment();
}
