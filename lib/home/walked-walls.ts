import { directionWord } from '@/lib/home/direction';
import { type Finish } from '@/lib/schemas/vocabulary';

type Stored = { wall: { id: string; name: string; azimuthDeg: number; finish: Finish } };

/** Walls as a walkaround asks about them, in the order in which one walks. */
export const walkedWalls = (walls: readonly Stored[]) => walls.map(({ wall }) => ({ id: wall.id, name: wall.name, hint: `faces ${directionWord(wall.azimuthDeg)}`, finish: wall.finish }));
