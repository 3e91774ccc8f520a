/** Runs once when a server process starts: loads the library and begins to watch for publishes. */
export async function register() {
  if (process.env.NEXT_RUNTIME !== 'nodejs' || process.env.NEXT_PHASE === 'phase-production-build') return;
  const { watchLibrary } = await import('@/lib/search/live-library');
  await watchLibrary();
}
