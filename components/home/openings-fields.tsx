'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field, SelectField } from '@/components/ui/field';
import { FieldError } from '@/components/ui/field-frame';
import { useAnswer } from '@/components/ui/form-context';
import { Stepper } from '@/components/ui/stepper';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

export type OpeningValues = { kind: 'window' | 'door'; width: string; height: string; count: string };
type Row = OpeningValues & { row: number };

const usual = (kind: 'window' | 'door', units: UnitSystem): OpeningValues => {
  const sizes = units === 'us' ? { window: ['3', '4'], door: ['3', '6 ft 8 in'] } : { window: ['0.9', '1.2'], door: ['0.9', '2.05'] };
  const [width = '', height = ''] = sizes[kind];
  return { kind, width, height, count: '1' };
};

/** Rows as they were sent, for a form that comes back without scripts. */
function sentRows(sent: unknown): Row[] | null {
  if (typeof sent !== 'object' || sent === null || Array.isArray(sent)) return null;
  return Object.entries(sent as Record<string, OpeningValues>).map(([row, values]) => ({ ...values, row: Number(row) }));
}

/** Doors and windows of a wall: one course a size, with how many of it. */
export function OpeningsFields({ units, values }: { units: UnitSystem; values: readonly OpeningValues[] }) {
  const { error, sent, wasSent } = useAnswer('openings');
  const [rows, setRows] = useState<Row[]>(() => (wasSent ? (sentRows(sent) ?? []) : values.map((one, row) => ({ ...one, row }))));
  const add = (kind: 'window' | 'door') => setRows((before) => [...before, { ...usual(kind, units), row: Math.max(-1, ...before.map((one) => one.row)) + 1 }]);
  const unit = units === 'us' ? 'ft' : 'm';
  return (
    <fieldset className="grid gap-3">
      <legend className="mb-1 font-semibold">Doors and windows</legend>
      {rows.length === 0 ? <p className="text-quiet">None yet: the whole wall counts as wood.</p> : null}
      {rows.map(({ row, ...one }, place) => (
        <div key={row} role="group" aria-label={`Opening ${place + 1}`} className="grid grid-cols-2 items-end gap-3 border-l-4 border-line pl-4 lg:grid-cols-[8rem_1fr_1fr_15rem_auto]">
          <SelectField label="Kind" name={`openings.${row}.kind`} options={{ window: 'Window', door: 'Door' }} defaultValue={one.kind} />
          <Field label="Width" name={`openings.${row}.width`} unit={unit} defaultValue={one.width} />
          <Field label="Height" name={`openings.${row}.height`} unit={unit} defaultValue={one.height} />
          <div className="max-lg:col-span-2">
            <Stepper label="How many" name={`openings.${row}.count`} min={1} max={50} defaultValue={one.count} />
          </div>
          <div className="max-lg:order-first max-lg:col-start-2 max-lg:row-start-1 max-lg:justify-self-end">
            <Button look="plain" aria-label={`Remove opening ${place + 1}`} onClick={() => setRows((before) => before.filter((other) => other.row !== row))}>
              Remove
            </Button>
          </div>
        </div>
      ))}
      {error ? <FieldError id="openings">{error}</FieldError> : null}
      <div className="needs-script flex flex-wrap gap-3">
        <Button look="quiet" onClick={() => add('window')}>
          Add a window
        </Button>
        <Button look="quiet" onClick={() => add('door')}>
          Add a door
        </Button>
      </div>
    </fieldset>
  );
}
