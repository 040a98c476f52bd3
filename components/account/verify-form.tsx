'use client';

import { postPassword } from '@/components/account/auth-post';
import { ActionForm } from '@/components/ui/action-form';
import { Field } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';

type Props = {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  token: string;
  email: string;
  /** In this browser, with the account that the link is for. */
  signedIn: boolean;
};

/** Confirms the address; whoever is not signed in proves the account by its password, and is signed in with it. */
export function VerifyForm({ action, token, email, signedIn }: Props) {
  const submit = async (previous: ActionState, form: FormData): Promise<ActionState> => {
    const state = await action(previous, form);
    if (!state.ok) return state;
    const password = form.get('password');
    const fault = typeof password === 'string' ? await postPassword({ email, password }) : null;
    window.location.assign(fault ? '/sign-in' : '/start');
    return { ok: true, message: 'Confirmed. One moment …' };
  };
  return (
    <ActionForm action={submit}>
      <input type="hidden" name="token" value={token} />
      {signedIn ? null : (
        <>
          <input type="hidden" name="username" autoComplete="username" value={email} readOnly />
          <Field label="The password you chose" name="password" type="password" autoComplete="current-password" required />
        </>
      )}
      <SubmitButton pendingLabel="One moment…">{signedIn ? 'Yes, it is mine' : 'Confirm and sign in'}</SubmitButton>
    </ActionForm>
  );
}
