import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { sidingProfile, wallAreaM2 } from '@/lib/takeoff';
import { areaText, inchesToMetres, lengthText } from '@/lib/units';

type Wall = { widthM: number; heightM: number; gableHeightM: number };
type Opening = { kind: 'window' | 'door'; widthM: number; heightM: number; count: number };

const count = (n: number, what: string) => `${n} ${what}${n === 1 ? '' : 's'}`;

/** A wall's measures in words, and the exposed face of a course (m) for its drawing. */
export function wallMeasures(wall: Wall, openings: readonly Opening[], sidingNominalIn: number, units: UnitSystem): { words: string; courseM: number } {
  const number = (kind: 'window' | 'door') => openings.filter((one) => one.kind === kind).reduce((sum, one) => sum + one.count, 0);
  const [windows, doors] = [number('window'), number('door')];
  const size = `${lengthText(wall.widthM, units)} wide, ${lengthText(wall.heightM, units)} high`;
  const gable = wall.gableHeightM > 0 ? `, gable ${lengthText(wall.gableHeightM, units)}` : '';
  const holes = [windows > 0 ? count(windows, 'window') : '', doors > 0 ? count(doors, 'door') : ''].filter(Boolean).join(' and ');
  return { words: `${size}${gable}${holes ? `, ${holes}` : ''}: ${areaText(wallAreaM2({ ...wall, openings: [...openings] }), units)} of wood.`, courseM: inchesToMetres(sidingProfile(sidingNominalIn)?.exposedFaceIn ?? sidingNominalIn) };
}
