'use client';

import { useState } from 'react';
import { RadioCourses } from '@/components/ui/choice-courses';
import { useAnswer } from '@/components/ui/form-context';
import { Stepper } from '@/components/ui/stepper';
import { keysOf, type Shade, shades } from '@/lib/schemas/vocabulary';

const hints: Record<Shade, string> = {
  open: 'Nothing stands between the wall and the sun',
  trees: 'Let some light through, more when bare',
  evergreens: 'Let little light through all year',
  building: 'Lets none through',
};

/** What stands in front of a wall, and how high. */
export function ShadeFields({ shade, heightDeg }: { shade: Shade; heightDeg: number }) {
  const { sent } = useAnswer('shade');
  const [chosen, setChosen] = useState(typeof sent === 'string' ? sent : shade);
  return (
    <div className="grid gap-5">
      <RadioCourses legend="What stands in front of it?" name="shade" options={keysOf(shades).map((value) => ({ value, label: shades[value], hint: hints[value] }))} defaultValue={shade} onPick={setChosen} />
      {chosen === 'open' ? (
        <input type="hidden" name="shadeHeightDeg" value="0" />
      ) : (
        <Stepper label="How high does it stand?" name="shadeHeightDeg" min={0} max={80} step={5} defaultValue={heightDeg || 30} unit="°" hint="Seen from the wall’s middle: 45° is as high as it is far away; a fist at arm’s length is about 10°." />
      )}
    </div>
  );
}
