'use client';

import { type ReactNode, useId } from 'react';
import { describe, FieldError } from '@/components/ui/field-frame';
import { useAnswer } from '@/components/ui/form-context';

type CheckFieldProps = {
  label: ReactNode;
  name: string;
  hint?: ReactNode;
  value?: string;
  defaultChecked?: boolean;
  onChange?: (checked: boolean) => void;
};

/** One yes-or-no; absent from the form when no. */
export function CheckField({ label, name, hint, value = 'on', defaultChecked = false, onChange }: CheckFieldProps) {
  const id = useId();
  const { error, sent, wasSent } = useAnswer(name);
  const checked = wasSent ? (Array.isArray(sent) ? sent.includes(value) : sent === value) : defaultChecked;
  return (
    <div>
      <label className="flex min-h-12 items-start gap-3 py-2">
        <input
          type="checkbox"
          name={name}
          value={value}
          defaultChecked={checked}
          onChange={(event) => onChange?.(event.target.checked)}
          {...describe(id, hint, error)}
          className="mt-0.5 size-6 shrink-0 accent-spruce"
        />
        <span>
          <span className="font-semibold">{label}</span>
          {hint ? (
            <span id={`${id}-hint`} className="block text-quiet">
              {hint}
            </span>
          ) : null}
        </span>
      </label>
      {error ? <FieldError id={id}>{error}</FieldError> : null}
    </div>
  );
}
