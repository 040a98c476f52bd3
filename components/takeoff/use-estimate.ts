'use client';

import { useEffect, useState } from 'react';
import useSWR from 'swr';

/** A moment after the last keystroke, ms. */
const pause = 250;

async function ask<A>(kind: string, body: string): Promise<A> {
  const response = await fetch(`/api/estimates/${kind}`, { method: 'POST', headers: { 'content-type': 'application/json' }, body });
  if (!response.ok) throw new Error('The estimate could not be made just now.');
  return (await response.json()) as A;
}

/** Asks for an estimate a moment after the last keystroke; the one before stays until the new one is here. No body, no answer. */
export function useEstimate<A>(kind: 'stain' | 'sealant', body: object | null, first: A | undefined) {
  const wanted = body ? JSON.stringify(body) : null;
  const [start] = useState(wanted);
  const [settled, setSettled] = useState(wanted);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(wanted), pause);
    return () => clearTimeout(timer);
  }, [wanted]);
  // The answer to what the page began with came with the page.
  const options = { keepPreviousData: true, revalidateOnFocus: false, revalidateIfStale: false, ...(settled === start && first ? { fallbackData: first } : {}) };
  const { data, error, isLoading, mutate } = useSWR<A, Error>(settled ? [kind, settled] : null, ([, sent]: [string, string]) => ask<A>(kind, sent), options);
  return { answer: wanted ? data : undefined, failure: error?.message, waiting: isLoading || settled !== wanted, retry: () => void mutate() };
}
