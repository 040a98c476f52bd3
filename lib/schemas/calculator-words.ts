import { type FormValues } from '@/lib/schemas/action-state';
import { rowsOf } from '@/lib/schemas/calculator-values';

const placeOf = (values: FormValues, path: string, key: string) => rowsOf(values, path).findIndex(([one]) => one === key) + 1;

/** What does not count yet, in words, from the fields that a begun row still lacks. */
export function notCounted(values: FormValues, missing: Record<string, string>): string[] {
  return Object.entries(missing).map(([name, message]) => {
    const [group = '', key = '', part, opening = ''] = name.split('.');
    const row = `${group === 'walls' ? 'Wall' : 'Container'} ${placeOf(values, group, key)}`;
    const what = part === 'openings' ? `Opening ${placeOf(values, `walls.${key}.openings`, opening)} of wall ${placeOf(values, group, key)}` : row;
    return `${what} does not count yet. ${message}`;
  });
}
