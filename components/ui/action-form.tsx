'use client';

import { unstable_rethrow } from 'next/navigation';
import { type ReactNode, type SubmitEvent, useActionState, useEffect, useRef, useState, useTransition } from 'react';
import { FormContext } from '@/components/ui/form-context';
import { FormMessage } from '@/components/ui/form-message';
import { type ActionState, untouched } from '@/lib/schemas/action-state';

type ActionFormProps = {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  children: ReactNode;
  className?: string;
  id?: string;
  /** Said once it is saved, when the action has no message of its own. */
  saved?: string;
  /** Empties the form once it is saved. */
  clear?: boolean;
  onSaved?: () => void;
};

const offline: ActionState = {
  ok: false,
  message: 'No answer from Eavewright: the connection may be down. What you entered is still here. Send it again when you are connected.',
};

/**
 * A form around a server action. With scripts it never resets what was entered, survives a lost connection,
 * moves to the first wrong field and says the outcome aloud; without scripts it is a plain form post.
 */
export function ActionForm({ action, children, className, id, saved, clear = false, onSaved }: ActionFormProps) {
  const [posted, post] = useActionState(action, untouched);
  const [answer, setAnswer] = useState<ActionState | null>(null);
  const [, startTransition] = useTransition();
  const form = useRef<HTMLFormElement>(null);
  const state = answer ?? posted;

  useEffect(() => {
    if (state.errors && form.current) firstWrong(form.current, Object.keys(state.errors))?.focus();
  }, [state]);

  const send = (event: SubmitEvent<HTMLFormElement>) => {
    event.preventDefault();
    const target = event.currentTarget;
    const data = new FormData(target, event.nativeEvent.submitter);
    startTransition(async () => {
      const next = await attempt(() => action(untouched, data));
      setAnswer(next);
      if (!next.ok) return;
      if (clear) target.reset();
      onSaved?.();
    });
  };

  const words = state.message ?? (answer?.ok ? saved : null);
  return (
    <FormContext value={state}>
      <form ref={form} id={id} action={post} onSubmit={send} noValidate className={className ?? 'grid max-w-2xl gap-6'}>
        {children}
        <div aria-live={state.ok ? 'polite' : 'assertive'} className={words ? '' : 'sr-only'}>
          {words ? <FormMessage tone={state.ok ? 'done' : 'fault'}>{words}</FormMessage> : null}
        </div>
      </form>
    </FormContext>
  );
}

async function attempt(run: () => Promise<ActionState>): Promise<ActionState> {
  try {
    return await run();
  } catch (error) {
    unstable_rethrow(error);
    if (error instanceof TypeError) return offline;
    throw error;
  }
}

function firstWrong(form: HTMLFormElement, names: string[]): HTMLElement | undefined {
  const wrong = (field: Element): field is HTMLElement =>
    field instanceof HTMLElement && 'name' in field && names.includes(String(field.name).replace(/\[\]$/, ''));
  return Array.from(form.elements).find((field): field is HTMLElement => wrong(field) && field.getAttribute('type') !== 'hidden');
}
