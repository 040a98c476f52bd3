import { type ReactNode } from 'react';
import { SignedInFrame } from '@/app/_server/signed-in-frame';

export default function ContractorLayout({ children }: { children: ReactNode }) {
  return <SignedInFrame roles={['contractor']}>{children}</SignedInFrame>;
}
