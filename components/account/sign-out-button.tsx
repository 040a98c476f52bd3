'use client';

import { signOut } from 'next-auth/react';
import { useState } from 'react';
import { Button } from '@/components/ui/button';

export function SignOutButton() {
  const [leaving, setLeaving] = useState(false);
  const leave = () => {
    setLeaving(true);
    void signOut({ callbackUrl: '/sign-in?said=signed-out' });
  };
  return (
    <Button look="plain" onClick={leave} pending={leaving} pendingLabel="Signing out…">
      Sign out
    </Button>
  );
}
