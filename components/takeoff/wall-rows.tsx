'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { type FormValues, type FormValue } from '@/lib/schemas/action-state';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

type Props = { units: UnitSystem; start: FormValues; onChange: () => void };

const isGroup = (value: FormValue | undefined): value is FormValues => typeof value === 'object' && !Array.isArray(value);
const typed = (start: FormValues, row: number, field: string): string | undefined => {
  const wall = isGroup(start.walls) ? start.walls[String(row)] : undefined;
  const value = isGroup(wall) ? wall[field] : undefined;
  return typeof value === 'string' ? value : undefined;
};

/** Walls by typed sizes; rows are added and taken away. */
export function WallRows({ units, start, onChange }: Props) {
  const [rows, setRows] = useState(() => Object.keys(isGroup(start.walls) ? start.walls : { 0: '' }).map(Number));
  const change = (next: number[]) => {
    setRows(next);
    setTimeout(onChange, 0);
  };
  const us = units === 'us';
  return (
    <div className="grid gap-4">
      {rows.map((row, index) => (
        <fieldset key={row} className="grid gap-4 border-l-4 border-lichen pl-4">
          <legend className="mb-1.5 font-semibold">Wall {index + 1}</legend>
          <div className="grid grid-cols-2 gap-4">
            <Field label="Width" name={`walls.${row}.width`} inputMode="decimal" unit={us ? 'ft' : 'm'} defaultValue={typed(start, row, 'width')} />
            <Field label="Height" name={`walls.${row}.height`} inputMode="decimal" unit={us ? 'ft' : 'm'} defaultValue={typed(start, row, 'height')} />
            <Field label="Gable height" name={`walls.${row}.gable`} inputMode="decimal" unit={us ? 'ft' : 'm'} defaultValue={typed(start, row, 'gable')} />
            <Field label="Doors, windows" name={`walls.${row}.openings`} inputMode="decimal" unit={us ? 'ft²' : 'm²'} defaultValue={typed(start, row, 'openings')} />
          </div>
          {rows.length > 1 ? <Button look="plain" onClick={() => change(rows.filter((one) => one !== row))}>Take wall {index + 1} away</Button> : null}
        </fieldset>
      ))}
      <div className="needs-script">
        <Button look="quiet" onClick={() => change([...rows, Math.max(...rows) + 1])}>Another wall</Button>
      </div>
    </div>
  );
}
