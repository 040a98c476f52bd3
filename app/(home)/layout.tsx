import { type ReactNode } from 'react';
import { SignedInFrame } from '@/app/_server/signed-in-frame';

export default function HomeownerLayout({ children }: { children: ReactNode }) {
  return <SignedInFrame roles={['homeowner']}>{children}</SignedInFrame>;
}
