'use client';

import { type FocusEvent, type FormEvent, useEffect, useRef, useState } from 'react';
import { type FormValues } from '@/lib/schemas/action-state';
import { editCalculator, rowsOf } from '@/lib/schemas/calculator-values';
import { readForm } from '@/lib/schemas/form-values';

/** Where the keyboard goes on after a row was added or removed. */
function focusAfter(edit: string, values: FormValues): string {
  const [act, target = ''] = edit.split(' ');
  const group = act === 'drop' ? target.split('.').slice(0, -1).join('.') : target;
  const last = rowsOf(values, group).at(-1)?.[0];
  if (act === 'to') return 'button[value^="to "]';
  return act === 'add' ? `[name^="${group}.${last}."]` : `button[value="add ${group}"]`;
}

type Reading = { faults: Record<string, string>; missing: Record<string, string> };

/** A form that is read while one types, with rows that its buttons add and take away. */
export function useTypedForm<R extends Reading>(start: FormValues, read: (values: FormValues) => R) {
  const form = useRef<HTMLFormElement>(null);
  const focus = useRef<string | null>(null);
  const [values, setValues] = useState<FormValues>(start);
  const reading = read(values);
  const [left, setLeft] = useState<ReadonlySet<string>>(() => new Set(Object.keys(reading.missing)));

  useEffect(() => {
    if (focus.current) form.current?.querySelector<HTMLElement>(focus.current)?.focus();
    focus.current = null;
  }, [values]);

  const typed = () => (form.current ? readForm(new FormData(form.current)) : values);
  const onInput = () => setValues(typed());
  const onSubmit = (event: FormEvent) => {
    event.preventDefault();
    const button = (event.nativeEvent as SubmitEvent).submitter;
    const edit = button instanceof HTMLButtonElement && button.name === 'edit' ? button.value : '';
    const next = editCalculator(typed(), edit);
    focus.current = edit ? focusAfter(edit, next) : null;
    setValues(next);
  };
  const onBlur = ({ target }: FocusEvent) => {
    const name = target instanceof HTMLInputElement ? target.name : '';
    if (name && !left.has(name)) setLeft(new Set([...left, name]));
  };

  // A begun row is not at fault before its field was reached and left.
  const reached = Object.entries(reading.missing).filter(([name]) => left.has(name));
  const errors: Record<string, string> = { ...Object.fromEntries(reached), ...reading.faults };
  return { form, values, reading, errors, on: { onInput, onBlur, onSubmit } };
}
