import 'server-only';
import { unstable_rethrow } from 'next/navigation';
import { type z } from 'zod';
import { type Actor, can, type HomeVerb, isRoleVerb, nobody, Refused, type RoleVerb } from '@/lib/permissions';
import { currentActor } from './actor';
import { environment } from './environment';
import { logFault } from './log';
import { fieldErrors, problem } from './problem';
import { sameSecret } from './secret';

/** Calls by machines: each needs the bearer secret of its own variable, and fails closed. */
const bearerSecrets = { cron: 'CRON_SECRET', bounces: 'BOUNCE_SECRET' } as const;
type Machine = keyof typeof bearerSecrets;
type Access = HomeVerb | RoleVerb | 'anyone' | 'signed in' | Machine;
type Context = { params: Promise<Record<string, string>> };
type Call<I> = { actor: Actor; input: I; params: Record<string, string>; request: Request };
type Definition<S extends z.ZodType> = {
  /** Role verbs are checked here; verbs on a home by the data layer's scope; calls by machines need their bearer secret. */
  verb: Access;
  /** Of the JSON body (POST) or the query string (GET). */
  schema?: S;
  /** 'json or text': a body that is not sent as JSON reaches the schema as the text it is. */
  reads?: 'json' | 'json or text';
  run: (call: Call<z.output<S>>) => unknown;
};

const largestBody = 200_000;

/** Declares a JSON route handler: authenticate, authorize, validate, run, answer JSON or an RFC 9457 problem. */
export function defineHandler<S extends z.ZodType>(definition: Definition<S>) {
  return async (request: Request, context: Context): Promise<Response> => {
    try {
      const gate = await admit(request, definition.verb);
      if (gate instanceof Response) return gate;
      const body = await readInput(request, definition.reads);
      if (body instanceof Response) return body;
      const parsed = definition.schema?.safeParse(body);
      if (parsed && !parsed.success) {
        return problem(422, 'Some values are not right', 'See errors for each field.', { errors: fieldErrors(parsed.error) });
      }
      const params = await context.params;
      const result = await definition.run({ actor: gate, input: parsed?.data as z.output<S>, params: params ?? {}, request });
      if (result instanceof Response) return result;
      return Response.json(result ?? {}, { headers: { 'cache-control': 'no-store' } });
    } catch (error) {
      unstable_rethrow(error);
      if (error instanceof Refused) return error.reason === 'not found' ? problem(404, 'Not found', error.message) : problem(403, 'Not allowed', error.message);
      const id = logFault(error, request.headers.get('x-request-id'));
      return problem(500, 'Something went wrong on our side', `Quote ${id} when you ask us about it.`);
    }
  };
}

async function admit(request: Request, verb: Access): Promise<Actor | Response> {
  if (verb === 'anyone') return nobody;
  if (isMachine(verb)) return admitMachine(request, bearerSecrets[verb]);
  const actor = await currentActor();
  if (!actor) return problem(401, 'Signed out', 'Sign in first.');
  if (isRoleVerb(verb) && !can(actor, verb)) return problem(403, 'Not allowed', 'Your account may not do this.');
  return actor;
}

const isMachine = (verb: Access): verb is Machine => verb in bearerSecrets;

function admitMachine(request: Request, variable: (typeof bearerSecrets)[Machine]): Actor | Response {
  const secret = environment()[variable];
  const given = /^Bearer (.+)$/i.exec(request.headers.get('authorization') ?? '')?.[1];
  if (!secret) return problem(503, 'Not set up', `${variable} is not set, so nobody may start this.`);
  return given && sameSecret(given, secret) ? nobody : problem(401, 'Not authorized', 'A bearer secret is needed.');
}

async function readInput(request: Request, reads: 'json' | 'json or text' = 'json'): Promise<unknown> {
  if (request.method === 'GET' || request.method === 'HEAD') return Object.fromEntries(new URL(request.url).searchParams);
  const text = await request.text();
  if (text.length > largestBody) return problem(413, 'Too large', `At most ${largestBody} characters.`);
  if (text === '') return {};
  if (reads === 'json or text' && !/\bjson\b/i.test(request.headers.get('content-type') ?? '')) return text;
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return problem(400, 'Not JSON', 'The body could not be read as JSON.');
  }
}
