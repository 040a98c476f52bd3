'use client';

import { useEffect } from 'react';
import { FormMessage } from '@/components/ui/form-message';
import { saidCookie } from '@/lib/said';

/** What the last action changed, said once on the page that it led to. */
export function Said({ words }: { words: string | null }) {
  useEffect(() => {
    if (words) document.cookie = `${saidCookie}=; path=/; max-age=0; samesite=lax`;
  }, [words]);
  return (
    <div role="status" className={words ? 'within pb-4' : 'sr-only'}>
      {words ? <FormMessage tone="done">{words}</FormMessage> : null}
    </div>
  );
}
