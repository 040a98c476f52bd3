import { type ComponentProps } from 'react';
import { WallFigures } from '@/components/home/wall-figures';
import { Course } from '@/components/ui/course';
import { directionWord } from '@/lib/home/direction';
import { coverWords } from '@/lib/home/cover';
import { wallMeasures } from '@/lib/home/wall-measures';
import { finishes, type Finish, type Sealant, sealants, type StainBase, stainBases, type Texture, textures } from '@/lib/schemas/vocabulary';
import { smallLengthText } from '@/lib/units';

type FigureProps = ComponentProps<typeof WallFigures>;
type Wall = FigureProps['planned']['wall'] & { id: string; widthM: number; heightM: number; gableHeightM: number; finish: Finish; stainBase: StainBase; texture: Texture; sealant: Sealant; colorHex: string; colorName: string | null };
type Opening = { kind: 'window' | 'door'; widthM: number; heightM: number; count: number };

type SharedWallProps = Omit<FigureProps, 'planned' | 'home' | 'films'> & {
  planned: FigureProps['planned'] & { wall: Wall; openings: readonly Opening[] };
  home: FigureProps['home'] & { sidingNominalIn: number };
};

/** What a crew needs to know of a wall: its measures, what is on it, how its films stand. */
export function SharedWall({ planned, home, station, today, units }: SharedWallProps) {
  const { wall, openings } = planned;
  const eave = wall.eaveDepthM > 0 ? `Eave ${smallLengthText(wall.eaveDepthM, units)} deep` : 'No eave';
  const cover = coverWords(wall, units);
  return (
    <Course id={`wall-${wall.id}`} heading={wall.name} aside={`faces ${directionWord(wall.azimuthDeg)}`} level={3}>
      <p className="text-lg">{wallMeasures(wall, openings, home.sidingNominalIn, units).words}</p>
      <p>
        <span aria-hidden="true" className="mr-2 inline-block size-4 border border-ink align-middle" style={{ background: wall.colorHex }} />
        {[finishes[wall.finish], wall.colorName, stainBases[wall.stainBase], textures[wall.texture]].filter(Boolean).join(' · ')}
      </p>
      <p>
        {[`${sealants[wall.sealant]} caulk`, eave, cover].filter(Boolean).join(' · ')}
      </p>
      <div className="mt-2 grid max-w-4xl gap-x-10 sm:grid-cols-2 sm:[&>details[open]]:col-span-full">
        <WallFigures planned={planned} home={home} station={station} today={today} units={units} films={['coat', 'seal']} />
      </div>
    </Course>
  );
}
