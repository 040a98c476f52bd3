'use client';

import { EditButton } from '@/components/takeoff/edit-button';
import { Field } from '@/components/ui/field';
import { type FormValues } from '@/lib/schemas/action-state';
import { rowsOf, typedIn } from '@/lib/schemas/calculator-values';

type ContainerFieldsProps = {
  values: FormValues;
  /** The name of their group of fields. */
  group?: string;
  /** What they hold, where more than one form on the page has containers. */
  of?: string;
  /** The unit of every size; without it a size is typed as its label says it. */
  unit?: string | undefined;
};

/** The containers that the shop has; the cheapest mix is worked out from them. */
export function ContainerFields({ values, group = 'containers', of = '', unit }: ContainerFieldsProps) {
  const rows = rowsOf(values, group);
  const name = of ? `${of} container` : 'Container';
  return (
    <fieldset className="grid gap-3">
      <legend className="mb-1.5 font-semibold">Containers and prices</legend>
      <p className="text-quiet">Our examples: change them to what your shop asks.{unit ? '' : ' Type a size as its label says it: 10.1 fl oz, or 600 mL.'}</p>
      {rows.map(([key, row], index) => (
        <div key={key} role="group" aria-label={`${name} ${index + 1}`} className="grid grid-cols-[minmax(0,1fr)_minmax(0,1.2fr)_auto] items-start gap-x-3">
          <Field label="Size" name={`${group}.${key}.size`} inputMode={unit ? 'decimal' : 'text'} autoComplete="off" unit={unit} defaultValue={typedIn(row, 'size')} />
          <Field label="Price" name={`${group}.${key}.price`} inputMode="decimal" autoComplete="off" unit="$" defaultValue={typedIn(row, 'price')} />
          {rows.length > 1 ? (
            <div className="self-end">
              <EditButton edit={`drop ${group}.${key}`} label={`Remove ${name.toLowerCase()} ${index + 1}`} look="plain">
                ✕
              </EditButton>
            </div>
          ) : (
            <span />
          )}
        </div>
      ))}
      <div>
        <EditButton edit={`add ${group}`}>Add a size</EditButton>
      </div>
    </fieldset>
  );
}
