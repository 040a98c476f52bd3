'use client';

import { Button } from '@/components/ui/button';

/** Prints the page; there only where scripts run. */
export function PrintButton({ children }: { children: string }) {
  return (
    <span className="needs-script no-print">
      <Button look="quiet" onClick={() => window.print()}>
        {children}
      </Button>
    </span>
  );
}
