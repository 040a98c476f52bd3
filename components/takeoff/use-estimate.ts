'use client';

import { useEffect, useState } from 'react';
import useSWR from 'swr';
import { readCalculator } from '@/lib/schemas/calculator';
import { type EstimateBody } from '@/lib/schemas/estimate';
import { type FormValues } from '@/lib/schemas/action-state';
import { type StainAnswer } from '@/lib/takeoff/estimate';

const isEmpty = (body: EstimateBody) => (body.areaM2 ?? 0) === 0 && (body.walls?.length ?? 0) === 0;

async function ask(body: string): Promise<StainAnswer> {
  const response = await fetch('/api/estimates/stain', { method: 'POST', headers: { 'content-type': 'application/json' }, body });
  const json = (await response.json()) as StainAnswer & { title?: string; detail?: string };
  if (!response.ok) throw new Error(json.detail ?? json.title ?? 'The estimate could not be made.');
  return json;
}

/** Asks for an estimate a moment after the last keystroke; the one before stays until the new one is here. */
export function useEstimate(values: FormValues, first: StainAnswer | undefined) {
  const read = readCalculator(values);
  const body = 'body' in read && !isEmpty(read.body) ? JSON.stringify(read.body) : null;
  const [settled, setSettled] = useState(body);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(body), 250);
    return () => clearTimeout(timer);
  }, [body]);
  const { data, error, isLoading } = useSWR<StainAnswer, Error>(settled ? ['stain', settled] : null, ([, sent]: [string, string]) => ask(sent), { keepPreviousData: true, fallbackData: first, revalidateOnFocus: false });
  return { faults: 'faults' in read ? read.faults : {}, answer: body ? data : undefined, failure: error?.message, waiting: isLoading || settled !== body };
}
