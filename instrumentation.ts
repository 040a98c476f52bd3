/** Runs once when the server starts: a wrong environment stops it with a message that names each variable. */
export async function register() {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { parseEnvironment } = await import('@/lib/schemas/environment');
  parseEnvironment(process.env);
}
