import { type FormValues } from '@/lib/schemas/action-state';
import { calculatorStart, editCalculator } from '@/lib/schemas/calculator-values';
import { queryForm, type QueryValues, readForm } from '@/lib/schemas/form-values';
import { type Texture, type UnitSystem } from '@/lib/schemas/vocabulary';
import { wallAreaM2 } from '@/lib/takeoff';
import { metresToInches } from '@/lib/units';

type Opening = { widthM: number; heightM: number; count: number };
type Measured = { wall: { id: string; name: string; widthM: number; heightM: number; gableHeightM: number; texture: Texture }; openings: readonly Opening[] };

/** Areas to a thousandth of a m²: they travel as text. */
const rounded = (areaM2: number) => Number(areaM2.toFixed(3));

/** The walls of a home as the calculator takes them, and what its form starts with: as sent, or the walls whose restain is next. */
export function buyingStart(home: { sidingNominalIn: number; crownHeightM: number }, walls: readonly Measured[], nextIds: readonly string[], units: UnitSystem, sent: QueryValues) {
  const areas = walls.map(({ wall, openings }) => ({ id: wall.id, name: wall.name, areaM2: rounded(wallAreaM2({ ...wall, openings: [...openings] })) }));
  const chosen = nextIds.length > 0 ? areas.filter(({ id }) => nextIds.includes(id)) : areas;
  const rough = walls.some(({ wall }) => chosen.some(({ id }) => id === wall.id) && wall.texture === 'saw-textured');
  const crown = units === 'us' ? metresToInches(home.crownHeightM) : home.crownHeightM * 100;
  const usual: FormValues = {
    units,
    chosenM2: chosen.map(({ id, areaM2 }) => `${areaM2}#${id}`),
    siding: String(home.sidingNominalIn),
    crown: String(Number(crown.toFixed(2))),
    texture: rough ? 'saw-textured' : 'smooth',
    coats: '2',
  };
  const typed = readForm(queryForm(sent));
  const start = calculatorStart({ ...usual, ...typed, units }, units);
  return { areas, start: editCalculator(start, typeof typed.edit === 'string' ? typed.edit : '') };
}
