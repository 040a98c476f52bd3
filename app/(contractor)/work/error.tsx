'use client';

import { FaultPage } from '@/components/ui/fault-page';

export default function WorkFault({ error, retry }: { error: unknown; retry: () => void }) {
  return <FaultPage error={error} retry={retry} />;
}
