'use client';

import { useId, useState } from 'react';
import { describe, FieldFrame } from '@/components/ui/field-frame';
import { useAnswer } from '@/components/ui/form-context';

/** Wood colours to start from; our own choice. */
const swatches = [
  { hex: '#C79A5B', name: 'Pale straw' },
  { hex: '#B9803F', name: 'Honey' },
  { hex: '#8A5A32', name: 'Walnut shell' },
  { hex: '#7A3F24', name: 'Red bark' },
  { hex: '#4B3425', name: 'Dark bark' },
  { hex: '#7C7F78', name: 'Driftwood gray' },
];

type ColorFieldProps = { label: string; name: string; defaultValue?: string };

/** A colour: one of a few woods at one touch, or any. */
export function ColorField({ label, name, defaultValue = '#8A5A32' }: ColorFieldProps) {
  const id = useId();
  const { error, sent } = useAnswer(name);
  const [hex, setHex] = useState(typeof sent === 'string' && sent ? sent : defaultValue);
  return (
    <FieldFrame id={id} label={label} error={error}>
      <div className="flex flex-wrap items-center gap-2">
        <input type="color" name={name} value={hex.toLowerCase()} onChange={(event) => setHex(event.target.value)} {...describe(id, null, error)} className="h-12 w-16 rounded-md border-2 border-lichen bg-snow p-1" />
        {swatches.map((swatch) => (
          <button
            key={swatch.hex}
            type="button"
            aria-label={swatch.name}
            aria-pressed={hex.toLowerCase() === swatch.hex.toLowerCase()}
            title={swatch.name}
            onClick={() => setHex(swatch.hex)}
            className="needs-script size-11 rounded-md border-2 border-lichen aria-pressed:border-4 aria-pressed:border-ink"
            style={{ background: swatch.hex }}
          />
        ))}
      </div>
    </FieldFrame>
  );
}
