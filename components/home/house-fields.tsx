'use client';

import { type FormEvent, useState } from 'react';
import { CompassDial } from '@/components/drawings/compass-dial';
import { eavePresets } from '@/components/home/eave-presets';
import { LengthField } from '@/components/home/length-field';
import { RadioCourses } from '@/components/ui/choice-courses';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

/** A house of the usual size, as its form shows it. Our own choice. */
const usual = {
  us: { front: '40', side: '28', height: '9', gable: '8', eave: '1 ft 6 in' },
  metric: { front: '12', side: '8.5', height: '2.75', gable: '2.4', eave: '0.45' },
} as const;

const gables = [
  { value: 'front', label: 'Front and back', hint: 'The roof peaks over the front door' },
  { value: 'sides', label: 'Both sides', hint: 'The roof peaks over the ends' },
  { value: 'none', label: 'No gables', hint: 'A hip roof, or a flat one' },
];

/** Direction and size of a house with four walls at right angles; the drawing takes on its proportions as they are typed. */
export function HouseFields({ units }: { units: UnitSystem }) {
  const start = usual[units];
  const [size, setSize] = useState({ frontWidth: parseFloat(start.front), sideWidth: parseFloat(start.side) });
  const [gablesOn, setGablesOn] = useState('sides');
  const measure = (event: FormEvent<HTMLDivElement>) => {
    const { name, value } = event.target as HTMLInputElement;
    const typed = parseFloat(value);
    if ((name === 'frontWidth' || name === 'sideWidth') && typed > 0) setSize((before) => ({ ...before, [name]: typed }));
  };
  return (
    <div className="grid items-start gap-x-12 gap-y-8 lg:grid-cols-2" onInput={measure}>
      <CompassDial name="compassDeg" hint="Turn the house until it stands as yours does. North is up." frontWidth={size.frontWidth} sideWidth={size.sideWidth} />
      <div className="grid content-start gap-5">
        <div className="grid grid-cols-2 gap-5">
          <LengthField label="Width of the front" name="frontWidth" units={units} defaultValue={start.front} />
          <LengthField label="Width of a side" name="sideWidth" units={units} defaultValue={start.side} />
          <LengthField label="Height of the walls" name="wallHeight" units={units} defaultValue={start.height} />
          {gablesOn === 'none' ? <input type="hidden" name="gableHeight" value="0" /> : <LengthField label="Height of a gable" name="gableHeight" units={units} defaultValue={start.gable} />}
        </div>
        <RadioCourses legend="Where are the gables?" name="gablesOn" options={gables} defaultValue="sides" onPick={setGablesOn} />
        <LengthField label="Depth of the eaves" name="eaveDepth" units={units} defaultValue={start.eave} hint="From the wall out to the drip edge." presets={eavePresets(units)} />
      </div>
    </div>
  );
}
