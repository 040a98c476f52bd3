import { type ReactNode } from 'react';
import { SignedInFrame } from '@/app/_server/signed-in-frame';

export default function OperatorLayout({ children }: { children: ReactNode }) {
  return <SignedInFrame roles={['operator']}>{children}</SignedInFrame>;
}
