'use client';

import { signIn } from 'next-auth/react';
import { ActionForm } from '@/components/ui/action-form';
import { Field } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';

type Props = { action: (previous: ActionState, form: FormData) => Promise<ActionState>; token: string; email: string };

/** Confirms the address and signs in with the same password. */
export function VerifyForm({ action, token, email }: Props) {
  const submit = async (previous: ActionState, form: FormData): Promise<ActionState> => {
    const state = await action(previous, form);
    if (!state.ok) return state;
    const password = form.get('password');
    const result = await signIn('credentials', { email, password: typeof password === 'string' ? password : '', redirect: false });
    window.location.assign(result?.ok && !result.error ? '/start' : '/sign-in');
    return { ok: true, message: 'Confirmed. One moment …' };
  };
  return (
    <ActionForm action={submit}>
      <input type="hidden" name="token" value={token} />
      <input type="hidden" name="username" autoComplete="username" value={email} readOnly />
      <Field label="The password you chose" name="password" type="password" autoComplete="current-password" required />
      <SubmitButton pendingLabel="One moment…">Confirm and sign in</SubmitButton>
    </ActionForm>
  );
}
