'use client';

import { type ReactNode } from 'react';
import { useFormStatus } from 'react-dom';
import { Button, type ButtonLook } from '@/components/ui/button';

type SubmitButtonProps = {
  children: ReactNode;
  pendingLabel?: ReactNode;
  look?: ButtonLook;
  wide?: boolean;
  name?: string;
  value?: string;
};

/** Sends the form that it stands in. */
export function SubmitButton({ children, pendingLabel = 'Saving…', ...rest }: SubmitButtonProps) {
  const { pending } = useFormStatus();
  return (
    <Button type="submit" pending={pending} pendingLabel={pendingLabel} {...rest}>
      {children}
    </Button>
  );
}
