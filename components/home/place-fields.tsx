'use client';

import { useState } from 'react';
import useSWR from 'swr';
import { Field, SelectField } from '@/components/ui/field';
import { useAnswer } from '@/components/ui/form-context';
import { PlaceAnswer } from '@/components/home/place-answer';
import { type Site, type SiteQuestion } from '@/lib/home/site';
import { readJson } from '@/components/home/read-json';
import { climateZones, type UnitSystem } from '@/lib/schemas/vocabulary';

type PlaceFieldsProps = {
  units: UnitSystem;
  defaults?: { postalCode: string; latitude: string; longitude: string; elevation: string; climateZoneOverride: string } | undefined;
};

const empty = { postalCode: '', latitude: '', longitude: '', elevation: '', climateZoneOverride: '' };

/** Look-up address once the code is whole; what is empty is left out. */
function address({ postalCode, ...rest }: { postalCode: string; latitude: string; longitude: string; climateZoneOverride: string }): string | null {
  if (!/^\d{5}$/.test(postalCode)) return null;
  const query = new URLSearchParams(Object.entries(rest).filter(([, value]) => value !== ''));
  return `/api/places/${postalCode}${query.size > 0 ? `?${query}` : ''}`;
}

/** The postal code, and what follows from it while it is typed. Asks for more only where the code does not say enough. */
export function PlaceFields({ units, defaults = empty }: PlaceFieldsProps) {
  const [typed, setTyped] = useState(defaults);
  const faults = [useAnswer('latitude').error, useAnswer('longitude').error, useAnswer('climateZoneOverride').error, useAnswer('elevation').error];
  const { data, error, isLoading } = useSWR<Site | SiteQuestion, Error>(address(typed), readJson, { keepPreviousData: true, revalidateOnFocus: false });
  const asks = data?.found === false;
  const note = (name: keyof typeof empty) => (event: { currentTarget: HTMLInputElement | HTMLSelectElement }) => {
    const value = event.currentTarget.value.trim();
    setTyped((before) => ({ ...before, [name]: name === 'postalCode' ? value.slice(0, 5) : value }));
  };
  return (
    <div className="grid gap-4">
      <div className="max-w-56">
        <Field label="Postal code" name="postalCode" required inputMode="numeric" autoComplete="postal-code" maxLength={10} defaultValue={defaults.postalCode} onInput={note('postalCode')} />
      </div>
      <PlaceAnswer answer={data} loading={isLoading} failed={error !== undefined} started={typed.postalCode.length === 5} units={units} />
      <details open={asks || faults.some(Boolean) || defaults.latitude !== '' || defaults.climateZoneOverride !== ''} className="border-l-4 border-line pl-4">
        <summary className="link min-h-11 py-2 font-semibold">Exact place, height and climate zone</summary>
        <div className="grid items-end gap-4 pt-2 sm:grid-cols-2">
          <Field label="Latitude" name="latitude" optional={!asks} inputMode="decimal" unit="° N" defaultValue={defaults.latitude} onInput={note('latitude')} />
          <Field label="Longitude" name="longitude" optional={!asks} inputMode="text" unit="° E" defaultValue={defaults.longitude} onInput={note('longitude')} />
          <Field label="Height above sea level" name="elevation" optional hint="Corrects temperatures where the home stands higher than the climate station." unit={units === 'us' ? 'ft' : 'm'} defaultValue={defaults.elevation} />
          <SelectField label="Climate zone" name="climateZoneOverride" hint="Only when the table is wrong for your home." options={climateZones.map((zone) => ({ value: zone, label: zone }))} empty="As the county’s" defaultValue={defaults.climateZoneOverride} onChange={note('climateZoneOverride')} />
        </div>
      </details>
    </div>
  );
}
