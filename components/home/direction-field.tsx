'use client';

import { useState } from 'react';
import { useAnswer } from '@/components/ui/form-context';
import { Stepper } from '@/components/ui/stepper';
import { directionWord } from '@/lib/home/direction';

/** Which way one wall faces, degrees clockwise from true north, said in words as it changes. */
export function DirectionField({ defaultValue }: { defaultValue: number }) {
  const { sent } = useAnswer('azimuthDeg');
  const [deg, setDeg] = useState(typeof sent === 'string' ? Number(sent) : defaultValue);
  return (
    <div className="grid gap-1">
      <Stepper label="It faces" name="azimuthDeg" min={0} max={359} step={1} defaultValue={defaultValue} unit="°" hint="Stand with your back to the wall and read a compass: 0 is north, 90 east, 180 south, 270 west." onChange={setDeg} />
      <p aria-live="polite" className="text-quiet">
        {Number.isFinite(deg) ? `Faces ${directionWord(deg)}` : ''}
      </p>
    </div>
  );
}
