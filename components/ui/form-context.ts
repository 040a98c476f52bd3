'use client';

import { createContext, useContext } from 'react';
import { type ActionState, type FormValue, untouched } from '@/lib/schemas/action-state';

export const FormContext = createContext<ActionState>(untouched);

/** 'walls.0.name' into nested values; 'wallIds[]' is the list under 'wallIds'. */
function find(values: FormValue | undefined, name: string): FormValue | undefined {
  const path = name.replace(/\[\]$/, '').split('.');
  return path.reduce<FormValue | undefined>(
    (value, key) => (typeof value === 'object' && !Array.isArray(value) && Object.hasOwn(value, key) ? value[key] : undefined),
    values,
  );
}

/** What the last answer of the action says about one field: its fault, and what had been entered. */
export function useAnswer(name: string): { error: string | undefined; sent: FormValue | undefined; wasSent: boolean } {
  const state = useContext(FormContext);
  return {
    error: state.errors?.[name.replace(/\[\]$/, '')],
    sent: state.values ? find(state.values, name) : undefined,
    wasSent: state.values !== undefined,
  };
}
