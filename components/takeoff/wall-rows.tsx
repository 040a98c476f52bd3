'use client';

import { EditButton } from '@/components/takeoff/edit-button';
import { Field } from '@/components/ui/field';
import { FieldError } from '@/components/ui/field-frame';
import { useAnswer } from '@/components/ui/form-context';
import { type FormValues } from '@/lib/schemas/action-state';
import { rowsOf, typedIn } from '@/lib/schemas/calculator-values';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

/** Walls by typed sizes; rows are added and taken away. */
export function WallRows({ units, values }: { units: UnitSystem; values: FormValues }) {
  const rows = rowsOf(values, 'walls');
  return (
    <div className="grid gap-6">
      {rows.map(([key, row], index) => (
        <WallRow key={key} units={units} path={`walls.${key}`} row={row} number={index + 1} alone={rows.length === 1} />
      ))}
      <div>
        <EditButton edit="add walls">Add a wall</EditButton>
      </div>
    </div>
  );
}

type WallRowProps = { units: UnitSystem; path: string; row: FormValues; number: number; alone: boolean };

function WallRow({ units, path, row, number, alone }: WallRowProps) {
  const unit = units === 'us' ? 'ft' : 'm';
  const { error } = useAnswer(`${path}.openings`);
  const openings = rowsOf(row, 'openings');
  const length = (label: string, field: string, more = {}) => <Field label={label} name={`${path}.${field}`} inputMode="decimal" autoComplete="off" unit={unit} defaultValue={typedIn(row, field)} {...more} />;
  return (
    <fieldset className="grid gap-4 border-l-4 border-lichen pl-4">
      <legend className="mb-1.5 text-lg font-semibold">Wall {number}</legend>
      <div className="grid grid-cols-2 items-start gap-4 sm:grid-cols-3">
        {length('Width', 'width')}
        {length('Height', 'height')}
        {length('Gable height', 'gable', { placeholder: 'none' })}
      </div>
      {openings.map(([key, one], index) => (
        <OpeningRow key={key} path={`${path}.openings.${key}`} row={one} unit={unit} number={index + 1} wall={number} />
      ))}
      {error ? <FieldError id={`${path}.openings`}>{error}</FieldError> : null}
      <div className="flex flex-wrap gap-3">
        <EditButton edit={`add ${path}.openings`} label={`Add a door or window to wall ${number}`} look="plain">
          Add a door or window
        </EditButton>
        {alone ? null : (
          <EditButton edit={`drop ${path}`} label={`Remove wall ${number}`} look="plain">
            Remove this wall
          </EditButton>
        )}
      </div>
    </fieldset>
  );
}

type OpeningRowProps = { path: string; row: FormValues; unit: string; number: number; wall: number };

function OpeningRow({ path, row, unit, number, wall }: OpeningRowProps) {
  const common = { inputMode: 'decimal', autoComplete: 'off' } as const;
  return (
    <div role="group" aria-label={`Opening ${number} of wall ${wall}`} className="grid grid-cols-2 items-start gap-x-4 gap-y-2 border-t border-line pt-3 sm:grid-cols-[minmax(0,1fr)_minmax(0,1fr)_6rem_auto]">
      <Field label={<span>Opening {number}, width</span>} name={`${path}.width`} unit={unit} defaultValue={typedIn(row, 'width')} {...common} />
      <Field label="Height" name={`${path}.height`} unit={unit} defaultValue={typedIn(row, 'height')} {...common} />
      <Field label="How many" name={`${path}.count`} placeholder="1" defaultValue={typedIn(row, 'count')} {...common} inputMode="numeric" />
      <div className="self-end">
        <EditButton edit={`drop ${path}`} label={`Remove opening ${number} of wall ${wall}`} look="plain">
          Remove
        </EditButton>
      </div>
    </div>
  );
}
