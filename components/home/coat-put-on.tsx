'use client';

import { useState } from 'react';
import { ColorField } from '@/components/home/color-field';
import { CheckField } from '@/components/ui/check-field';
import { Field, SelectField } from '@/components/ui/field';
import { finishes, stainBases, type UnitSystem } from '@/lib/schemas/vocabulary';

/** What went onto the wood, where it differs from what was there. */
export function CoatPutOn({ units }: { units: UnitSystem }) {
  const [otherColor, setOtherColor] = useState(false);
  return (
    <div className="grid gap-5">
      <div className="grid gap-5 sm:grid-cols-2">
        <SelectField label="Finish" name="finish" options={finishes} empty="The same as before" />
        <SelectField label="Oil or waterborne" name="stainBase" options={stainBases} empty="The same as before" />
      </div>
      <div className="max-w-56">
        <Field label="Stain used" name="amount" optional inputMode="decimal" unit={units === 'us' ? 'gal' : 'L'} />
      </div>
      <CheckField label="Another color than before" name="otherColor" onChange={setOtherColor} />
      {otherColor ? <ColorField label="Color" name="colorHex" /> : null}
    </div>
  );
}
