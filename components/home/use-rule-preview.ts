'use client';

import { useEffect, useState } from 'react';
import useSWR from 'swr';
import { type OwnPreview } from '@/lib/care/own-preview';

/** A moment after the last keystroke, ms. */
const pause = 350;

async function ask([address, body]: [string, string]): Promise<OwnPreview> {
  const response = await fetch(address, { method: 'POST', headers: { 'content-type': 'application/json' }, body });
  if (response.status === 422) {
    const { errors } = (await response.json()) as { errors: Record<string, string> };
    return { ok: false, about: 'rule', error: Object.values(errors)[0] ?? 'Some values are not right.' };
  }
  if (!response.ok) throw new Error('The days could not be worked out just now. You can save all the same: the rule is checked again.');
  return (await response.json()) as OwnPreview;
}

/** The days of the rule that is typed, a moment after the last keystroke; the page brings those that it begins with. */
export function useRulePreview(homeId: string, typed: string | null, first: OwnPreview) {
  const [settled, setSettled] = useState<string | null>(null);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(typed), pause);
    return () => clearTimeout(timer);
  }, [typed]);
  const key: [string, string] | null = settled ? [`/api/homes/${homeId}/rule-preview`, settled] : null;
  const { data, error, isLoading } = useSWR<OwnPreview, Error>(key, ask, { keepPreviousData: true, revalidateOnFocus: false });
  return { preview: data ?? first, failure: error?.message, waiting: isLoading || settled !== typed };
}
