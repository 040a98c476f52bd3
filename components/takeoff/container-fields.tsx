'use client';

import { EditButton } from '@/components/takeoff/edit-button';
import { Field } from '@/components/ui/field';
import { type FormValues } from '@/lib/schemas/action-state';
import { rowsOf, typedIn } from '@/lib/schemas/calculator-values';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

/** The containers that the shop has; the cheapest mix is worked out from them. */
export function ContainerFields({ units, values }: { units: UnitSystem; values: FormValues }) {
  const rows = rowsOf(values, 'containers');
  return (
    <fieldset className="grid gap-3">
      <legend className="mb-1.5 font-semibold">Containers and prices</legend>
      <p className="text-quiet">Our examples: change them to what your shop asks.</p>
      {rows.map(([key, row], index) => (
        <div key={key} role="group" aria-label={`Container ${index + 1}`} className="grid grid-cols-[minmax(0,1fr)_minmax(0,1.2fr)_auto] items-start gap-x-3">
          <Field label="Size" name={`containers.${key}.size`} inputMode="decimal" autoComplete="off" unit={units === 'us' ? 'gal' : 'L'} defaultValue={typedIn(row, 'size')} />
          <Field label="Price" name={`containers.${key}.price`} inputMode="decimal" autoComplete="off" unit="$" defaultValue={typedIn(row, 'price')} />
          {rows.length > 1 ? (
            <div className="self-end">
              <EditButton edit={`drop containers.${key}`} label={`Remove container ${index + 1}`} look="plain">
                ✕
              </EditButton>
            </div>
          ) : (
            <span />
          )}
        </div>
      ))}
      <div>
        <EditButton edit="add containers">Add a size</EditButton>
      </div>
    </fieldset>
  );
}
