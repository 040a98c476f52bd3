import { type FormValues } from '@/lib/schemas/action-state';
import { type Texture, type UnitSystem } from '@/lib/schemas/vocabulary';
import { wallAreaM2 } from '@/lib/takeoff';
import { metresToInches } from '@/lib/units';

type Opening = { widthM: number; heightM: number; count: number };
type Measured = { wall: { id: string; name: string; widthM: number; heightM: number; gableHeightM: number; texture: Texture }; openings: readonly Opening[] };
type Query = Record<string, string | string[] | undefined>;

/** Areas to a thousandth of a m²: they travel as text. */
const rounded = (areaM2: number) => Number(areaM2.toFixed(3));

/** The walls of a home as the calculator takes them, and what its form starts with: as sent, or the walls whose restain is next. */
export function buyingStart(home: { sidingNominalIn: number; crownHeightM: number }, walls: readonly Measured[], nextIds: readonly string[], units: UnitSystem, sent: Query) {
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
  return { areas, start: { ...usual, ...sentValues(sent) } };
}

/** The fields of a form that was sent without scripts; lists come back as lists. */
function sentValues(sent: Query): FormValues {
  const known = ['siding', 'crown', 'texture', 'coats', 'coverageLow', 'coverageHigh', 'waste'] as const;
  const values: FormValues = {};
  for (const name of known) if (typeof sent[name] === 'string') values[name] = sent[name];
  const walls = sent['chosenM2[]'];
  if (walls !== undefined) values.chosenM2 = [walls].flat();
  return values;
}
