import 'server-only';

/** Logs a bug once, as one JSON line, and returns the id to show. No personal data: message and stack only. */
export function logFault(error: unknown, requestId?: string | null): string {
  const id = requestId ?? crypto.randomUUID().slice(0, 8);
  const { message, stack } = error instanceof Error ? error : new Error(String(error));
  console.error(JSON.stringify({ level: 'error', requestId: id, at: new Date().toISOString(), message, stack }));
  return id;
}
