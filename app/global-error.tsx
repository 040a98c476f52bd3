'use client';

import { fontVariables } from '@/app/fonts';
import { FaultPage } from '@/components/ui/fault-page';
import './globals.css';

/** Replaces the root layout when that itself fails. */
export default function GlobalError({ error, retry }: { error: unknown; retry: () => void }) {
  return (
    <html lang="en-US" className={fontVariables}>
      <body>
        <title>This page could not be shown · Eavewright</title>
        <FaultPage error={error} retry={retry} />
      </body>
    </html>
  );
}
