import { type ReactNode } from 'react';
import PublicLayout from '@/app/(public)/layout';
import { currentActor } from '@/app/_server/actor';
import { SignedInFrame } from '@/app/_server/signed-in-frame';

/** Pages for everybody; whoever is signed in keeps their own header. */
export default async function ToolsLayout({ children }: { children: ReactNode }) {
  if (!(await currentActor())) return <PublicLayout>{children}</PublicLayout>;
  return (
    <SignedInFrame>
      <main id="main">{children}</main>
    </SignedInFrame>
  );
}
