import { homeProfileFactor } from '@/lib/jobs/work-ahead';
import { type FormValues } from '@/lib/schemas/action-state';
import { editCalculator } from '@/lib/schemas/calculator-values';
import { type CleanerAsk, usualCleaner } from '@/lib/schemas/cleaner-form';
import { queryForm, type QueryValues, readForm } from '@/lib/schemas/form-values';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

/** The walls of a home as the cleaner's form takes them, and what it starts with: as sent, or the walls whose restain is next, or all. */
export function cleanerStart(home: { sidingNominalIn: number; crownHeightM: number }, areas: CleanerAsk['walls'], nextIds: readonly string[], units: UnitSystem, sent: QueryValues): { ask: CleanerAsk; start: FormValues } {
  const ask: CleanerAsk = { walls: areas, profileFactor: homeProfileFactor(home), units };
  const typed = readForm(queryForm(sent));
  const usual = usualCleaner(nextIds.length > 0 ? nextIds : areas.map(({ id }) => id), units, typed);
  const asSent: FormValues = { ...Object.fromEntries(Object.entries(usual).map(([field, value]) => [field, typed[field] ?? value])), cleanerContainers: usual.cleanerContainers ?? {} };
  return { ask, start: editCalculator(asSent, typeof typed.edit === 'string' ? typed.edit : '') };
}
