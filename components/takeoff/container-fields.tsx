'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { type FormValue, type FormValues } from '@/lib/schemas/action-state';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { exampleContainers } from '@/lib/takeoff/stain';
import { litresPerGallon } from '@/lib/units';

type Props = { units: UnitSystem; start: FormValues; onChange: () => void };

const isGroup = (value: FormValue | undefined): value is FormValues => typeof value === 'object' && !Array.isArray(value);

type Row = { key: number; size: string; price: string };

/** Sizes and example prices in the reader's units, as a form shows them. */
const examples = (units: UnitSystem): Row[] =>
  exampleContainers.map(({ gal, priceCents }, key) => ({ key, size: units === 'us' ? String(gal) : (gal * litresPerGallon).toFixed(2), price: (priceCents / 100).toFixed(2) }));

function startRows(start: FormValues, units: UnitSystem): Row[] {
  if (!isGroup(start.containers)) return examples(units);
  return Object.entries(start.containers).flatMap(([key, row]) => (isGroup(row) ? [{ key: Number(key), size: String(row.size ?? ''), price: String(row.price ?? '') }] : []));
}

/** The cans that the shop has; the cheapest mix is worked out from them. */
export function ContainerFields({ units, start, onChange }: Props) {
  const [rows, setRows] = useState(() => startRows(start, units));
  const change = (next: Row[]) => {
    setRows(next);
    setTimeout(onChange, 0);
  };
  return (
    <fieldset className="grid gap-3">
      <legend className="mb-1.5 font-semibold">Containers and prices</legend>
      <p className="text-quiet">Our examples: change them to what your shop asks.</p>
      {rows.map((row) => (
        <div key={row.key} className="grid grid-cols-[minmax(0,1fr)_minmax(0,1fr)_auto] items-end gap-3">
          <Field label="Size" name={`containers.${row.key}.size`} inputMode="decimal" unit={units === 'us' ? 'gal' : 'L'} defaultValue={row.size} />
          <Field label="Price" name={`containers.${row.key}.price`} inputMode="decimal" unit="$" defaultValue={row.price} />
          {rows.length > 1 ? (
            <Button look="plain" aria-label={`Take the container of ${row.size} away`} onClick={() => change(rows.filter((one) => one.key !== row.key))}>
              ✕
            </Button>
          ) : <span />}
        </div>
      ))}
      <div className="needs-script">
        <Button look="quiet" onClick={() => change([...rows, { key: Math.max(...rows.map((row) => row.key)) + 1, size: '', price: '' }])}>Another size</Button>
      </div>
    </fieldset>
  );
}
