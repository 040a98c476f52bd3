'use client';

import { useRef } from 'react';
import { Field } from '@/components/ui/field';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

type LengthFieldProps = {
  label: string;
  name: string;
  units: UnitSystem;
  defaultValue?: string;
  hint?: string;
  optional?: boolean;
  /** Common sizes at one touch. */
  presets?: readonly { label: string; value: string }[];
};

/** A length as people write it: '30', '30 ft 6 in', '9.1'. */
export function LengthField({ units, presets = [], ...field }: LengthFieldProps) {
  const input = useRef<HTMLInputElement>(null);
  const fill = (value: string) => {
    if (!input.current) return;
    input.current.value = value;
    input.current.dispatchEvent(new Event('input', { bubbles: true }));
  };
  return (
    <div className="grid gap-2">
      <Field {...field} ref={input} type="text" inputMode="text" autoComplete="off" unit={units === 'us' ? 'ft' : 'm'} />
      {presets.length > 0 ? (
        <div className="needs-script flex flex-wrap gap-2">
          {presets.map((preset) => (
            <button key={preset.label} type="button" onClick={() => fill(preset.value)} className="min-h-11 rounded-md border-2 border-line bg-inset px-3">
              {preset.label}
            </button>
          ))}
        </div>
      ) : null}
    </div>
  );
}
