'use client';

import { signIn } from 'next-auth/react';
import { useState } from 'react';
import { ActionForm } from '@/components/ui/action-form';
import { Field } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';

const text = (form: FormData, name: string) => {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
};

/** What the server's code means, in words. */
export function signInFault(code: string): string {
  if (code.startsWith('wait:')) return `Too many tries. Wait ${code.slice(5)} minutes, or ask for a sign-in link below.`;
  if (code === 'unverified') return 'Your address is not confirmed yet. We have just sent the link again: look in your mail.';
  if (code === 'wrong' || code === 'CredentialsSignin') return 'This e-mail address and password do not go together.';
  return 'Signing in did not work just now. Nothing is lost: try again in a minute.';
}

/** Signs in with e-mail and password. A full page load follows, so that nothing of the signed-out state stays. */
export function PasswordForm({ goTo, email = '' }: { goTo: string; email?: string }) {
  const submit = async (_: ActionState, form: FormData): Promise<ActionState> => {
    const typed = text(form, 'email');
    const result = await signIn('credentials', { email: typed, password: text(form, 'password'), redirect: false, callbackUrl: goTo });
    if (!result?.ok || result.error) return { ok: false, message: signInFault(result?.error ?? ''), values: { email: typed } };
    window.location.assign(goTo);
    return { ok: true, message: 'Signed in. One moment …' };
  };
  return (
    <ActionForm action={submit}>
      <Field label="E-mail address" name="email" type="email" autoComplete="username" inputMode="email" required defaultValue={email} />
      <Field label="Password" name="password" type="password" autoComplete="current-password" required />
      <SubmitButton pendingLabel="Signing in…">Sign in</SubmitButton>
    </ActionForm>
  );
}

/** Asks for a link by mail. The answer is the same whether the address has an account or not. */
export function LinkForm({ goTo }: { goTo: string }) {
  const [sentTo, setSentTo] = useState<string | null>(null);
  const submit = async (_: ActionState, form: FormData): Promise<ActionState> => {
    const typed = text(form, 'email').trim();
    if (!/^\S+@\S+\.\S+$/.test(typed)) return { ok: false, message: 'Please look at the marked fields.', errors: { email: 'This is not an e-mail address. It looks like name@example.com.' }, values: { email: typed } };
    const result = await signIn('email', { email: typed, redirect: false, callbackUrl: goTo });
    if (!result?.ok || result.error) return { ok: false, message: 'The link could not be sent just now: too many were asked for, or our mail is down. Try again in a while.', values: { email: typed } };
    setSentTo(typed);
    return { ok: true, message: `A link is on its way to ${typed}. It works once, for two hours.` };
  };
  return (
    <ActionForm action={submit}>
      <Field label="E-mail address for the link" name="email" type="email" autoComplete="email" inputMode="email" required />
      <SubmitButton look="quiet" pendingLabel="Sending…">{sentTo ? 'Send it again' : 'Send me a sign-in link'}</SubmitButton>
    </ActionForm>
  );
}
