import { type FormValues } from '@/lib/schemas/action-state';
import { editCalculator } from '@/lib/schemas/calculator-values';
import { queryForm, type QueryValues, readForm } from '@/lib/schemas/form-values';
import { answerCaulk, type CaulkAsk, usualCaulk } from '@/lib/schemas/sealant-form';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { metresToFeet } from '@/lib/units';

type Opening = { widthM: number; heightM: number; count: number };
type Measured = { wall: { id: string; name: string; widthM: number; heightM: number; gableHeightM: number; corners: number; pipes: number }; openings: readonly Opening[] };

/** The walls of a home as the caulk's form takes them, and what it starts with: as sent, or the walls whose recaulk is next, or all. */
export function caulkStart(home: { sidingNominalIn: number }, walls: readonly Measured[], nextIds: readonly string[], units: UnitSystem, sent: QueryValues) {
  const ask: CaulkAsk = {
    nominalIn: home.sidingNominalIn,
    units,
    walls: walls.map(({ wall, openings }) => ({
      id: wall.id,
      name: wall.name,
      widthFt: metresToFeet(wall.widthM),
      heightFt: metresToFeet(wall.heightM),
      gableHeightFt: metresToFeet(wall.gableHeightM),
      corners: wall.corners,
      pipes: wall.pipes,
      openings: openings.map(({ widthM, heightM, count }) => ({ widthFt: metresToFeet(widthM), heightFt: metresToFeet(heightM), count })),
    })),
  };
  const typed = readForm(queryForm(sent));
  const usual = usualCaulk(nextIds.length > 0 ? nextIds : walls.map(({ wall }) => wall.id), units, typed);
  const asSent: FormValues = { ...Object.fromEntries(Object.entries(usual).map(([field, value]) => [field, typed[field] ?? value])), caulkContainers: usual.caulkContainers ?? {} };
  const start = editCalculator(asSent, typeof typed.edit === 'string' ? typed.edit : '');
  return { ask, start, first: answerCaulk(start, ask) };
}
