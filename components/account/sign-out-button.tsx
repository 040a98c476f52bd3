'use client';

import { useState } from 'react';
import { postSignOut } from '@/components/account/auth-post';
import { Button, type ButtonLook } from '@/components/ui/button';

/** Signs out of this browser. A full page load follows, so that nothing of the signed-in state stays. */
export function SignOutButton({ look = 'plain', label = 'Sign out' }: { look?: ButtonLook; label?: string }) {
  const [state, setState] = useState<'in' | 'leaving' | 'failed'>('in');
  const leave = async () => {
    setState('leaving');
    const next = await postSignOut().catch(() => null);
    if (next) window.location.assign(next);
    else setState('failed');
  };
  return (
    <span aria-live="polite">
      <Button look={look} onClick={() => void leave()} pending={state === 'leaving'} pendingLabel="Signing out…">
        {state === 'failed' ? 'Still signed in: try again' : label}
      </Button>
    </span>
  );
}
