/** Start-up: database, fakes, the invented shop in the demo, and the worker that sends what is due. */
export async function register() {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { startOrEnd } = await import('./server/start/start-or-end');
  await startOrEnd();
}
