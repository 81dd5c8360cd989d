/** Runs once when the server starts, before the first request. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { noteSockets } = await import('./lib/auth/visitor-address');
  noteSockets();
  const { startServer } = await import('./lib/services/start-server');
  await startServer();
}
