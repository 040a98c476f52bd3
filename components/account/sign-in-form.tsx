'use client';

import { useState } from 'react';
import { askForLink, postPassword } from '@/components/account/auth-post';
import { ActionForm } from '@/components/ui/action-form';
import { Field } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';
import { signInFault } from '@/lib/sign-in-words';

const text = (form: FormData, name: string) => {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
};

const missing = (field: string, message: string, values: Record<string, string>): ActionState => ({ ok: false, message: 'Please look at the marked fields.', errors: { [field]: message }, values });

/** Signs in with e-mail and password. A full page load follows, so that nothing of the signed-out state stays. */
export function PasswordForm({ goTo, email = '' }: { goTo: string; email?: string }) {
  const submit = async (_: ActionState, form: FormData): Promise<ActionState> => {
    const typed = text(form, 'email');
    const password = text(form, 'password');
    if (!typed.trim()) return missing('email', 'The e-mail address is missing.', { email: typed });
    if (!password) return missing('password', 'The password is missing.', { email: typed });
    const fault = await postPassword({ email: typed, password, callbackUrl: goTo });
    if (fault) return { ok: false, message: signInFault(fault), values: { email: typed } };
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
  const [sent, setSent] = useState(false);
  const submit = async (_: ActionState, form: FormData): Promise<ActionState> => {
    const typed = text(form, 'email').trim();
    if (!typed) return missing('email', 'The e-mail address is missing.', { email: typed });
    const fault = await askForLink({ email: typed, callbackUrl: goTo });
    if (fault === 'Address') return missing('email', signInFault(fault), { email: typed });
    if (fault) return { ok: false, message: signInFault(fault), values: { email: typed } };
    setSent(true);
    return { ok: true, message: `A link is on its way to ${typed}. It works once, for two hours.` };
  };
  return (
    <ActionForm action={submit}>
      <Field label="E-mail address for the link" name="email" type="email" autoComplete="email" inputMode="email" required />
      <SubmitButton look="quiet" pendingLabel="Sending…">{sent ? 'Send it again' : 'Send me a sign-in link'}</SubmitButton>
    </ActionForm>
  );
}
