'use client';

import { FaultPage } from '@/components/ui/fault-page';
import { SiteHeader } from '@/components/ui/site-header';

export default function ErrorPage({ error, retry }: { error: unknown; retry: () => void }) {
  return (
    <>
      <SiteHeader />
      <FaultPage error={error} retry={retry} />
    </>
  );
}
