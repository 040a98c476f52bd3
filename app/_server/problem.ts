import { type ZodError } from 'zod';

export type FieldErrors = Record<string, string>;

/** RFC 9457 problem details as a response. */
export function problem(status: number, title: string, detail?: string, extra: Record<string, unknown> = {}): Response {
  return Response.json(
    { type: 'about:blank', title, status, ...(detail ? { detail } : {}), ...extra },
    { status, headers: { 'content-type': 'application/problem+json', 'cache-control': 'no-store' } },
  );
}

/** The first message for each field, keyed by its path with dots ('walls.0.widthM'); faults of the whole under ''. */
export function fieldErrors(error: ZodError): FieldErrors {
  const errors: FieldErrors = {};
  for (const issue of error.issues) errors[issue.path.join('.')] ??= issue.message;
  return errors;
}
