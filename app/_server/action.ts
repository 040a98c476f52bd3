import 'server-only';
import { headers } from 'next/headers';
import { unstable_rethrow } from 'next/navigation';
import { type z } from 'zod';
import { transaction } from '@/db/queries/transaction';
import { type Actor, can, type HomeVerb, isRoleVerb, nobody, Refused, type RoleVerb } from '@/lib/permissions';
import { type ActionState, type FormValues } from '@/lib/schemas/action-state';
import { currentActor } from './actor';
import { readForm } from '@/lib/schemas/form-values';
import { logFault } from './log';
import { fieldErrors } from './problem';

type Definition<S extends z.ZodType, R> = {
  /** A verb that the role alone decides is checked here; verbs on a home are checked by the data layer's scope. 'anyone' needs no sign-in. */
  verb: RoleVerb | HomeVerb | 'anyone' | 'signed in';
  schema: S;
  /** Slow work before the transaction (hashing, look-ups). */
  prepare?: (input: z.output<S>) => Promise<unknown>;
  /** Runs in one immediate transaction; synchronous, as the database is. */
  run: (actor: Actor, input: z.output<S>, prepared: unknown) => R | FieldFault;
  /** After the commit: revalidate, send, redirect. */
  after?: (result: R, input: z.output<S>, actor: Actor) => Promise<void> | void;
};

/** An expected refusal by the domain, shown beside a field ('' = the whole form). */
export class FieldFault {
  constructor(readonly errors: Record<string, string>) {}
}

const marked = (errors: Record<string, string>, values: FormValues): ActionState => ({ ok: false, errors, values, message: errors[''] ?? 'Please look at the marked fields.' });

/** Fields that are never sent back. */
const secrets = ['password', 'current'];

/**
 * Declares a server action for useActionState: authenticate, authorize, validate, run in a transaction, answer with a typed state.
 * What was typed comes back in `values`, so that nothing entered is lost; passwords do not.
 */
export function defineAction<S extends z.ZodType, R>(definition: Definition<S, R>) {
  return async (_previous: ActionState, form: FormData): Promise<ActionState> => {
    const sent = readForm(form);
    const values = Object.fromEntries(Object.entries(sent).filter(([name]) => !secrets.includes(name)));
    try {
      const actor = definition.verb === 'anyone' ? nobody : await currentActor();
      if (!actor) return { ok: false, message: 'You are signed out. Sign in in another tab, then send this again: nothing you typed is lost.', values };
      if (isRoleVerb(definition.verb) && !can(actor, definition.verb)) {
        return { ok: false, message: 'Your account may not do this.', values };
      }
      const parsed = definition.schema.safeParse(sent);
      if (!parsed.success) return marked(fieldErrors(parsed.error), values);
      const prepared = await definition.prepare?.(parsed.data);
      const result = transaction(() => definition.run(actor, parsed.data, prepared));
      if (result instanceof FieldFault) return marked(result.errors, values);
      await definition.after?.(result, parsed.data, actor);
      return { ok: true, message: null };
    } catch (error) {
      unstable_rethrow(error);
      if (error instanceof Refused) {
        const message = error.reason === 'not found' ? `${error.message}. It may have been removed.` : 'You may look at this home but not change this.';
        return { ok: false, message, values };
      }
      const requestId = logFault(error, (await headers()).get('x-request-id'));
      return { ok: false, message: `Something went wrong on our side (${requestId}). Nothing was saved; what you typed is still here.`, values };
    }
  };
}
