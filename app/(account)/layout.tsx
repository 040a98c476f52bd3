import { type ReactNode } from 'react';
import { SignedInFrame } from '@/app/_server/signed-in-frame';

export default function AccountLayout({ children }: { children: ReactNode }) {
  return <SignedInFrame>{children}</SignedInFrame>;
}
