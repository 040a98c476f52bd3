import { type Metadata } from 'next';
import { pageData, pageHome } from '@/app/_server/page-data';
import { usualCoat } from '@/components/home/coat-fields';
import { WallForm } from '@/components/home/wall-form';
import { PageHead } from '@/components/ui/page-head';
import { homeOf } from '@/db/queries/homes';
import { unitsOf } from '@/db/queries/units';
import { dayIn } from '@/lib/calendar';
import { noCover, wallLengths } from '@/lib/home/form-values';
import { addWallToHome } from '../actions';

export const metadata: Metadata = { title: 'Add a wall' };

type Props = { params: Promise<{ homeId: string }> };

const plainWall = { azimuthDeg: 180, widthM: 9.144, heightM: 2.7432, gableHeightM: 0, eaveDepthM: 0.4572, eaveDropM: 0 };

export default async function NewWallPage({ params }: Props) {
  const { actor, view } = await pageHome((await params).homeId);
  const { home } = pageData(() => homeOf(actor, view.home.id, 'home.edit'));
  const units = unitsOf(actor);
  const like = view.walls.at(-1)?.wall;
  const start = like ? { ...plainWall, azimuthDeg: (like.azimuthDeg + 90) % 360, heightM: like.heightM, eaveDepthM: like.eaveDepthM } : plainWall;
  const coat = like ? { finish: like.finish, stainBase: like.stainBase, colorHex: like.colorHex, colorName: like.colorName ?? '', texture: like.texture, sealant: like.sealant } : usualCoat;
  const values = { name: '', shade: 'open' as const, shadeHeightDeg: 0, weatherSide: false, cover: noCover, corners: like?.corners ?? 2, pipes: 0, ...wallLengths(start, units), openings: [], coat, stained: undefined, caulked: undefined };
  return (
    <main id="main">
      <PageHead title="Add a wall" lead={like ? `Filled in after ${like.name}, a quarter turn on: change what differs.` : undefined} path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${home.id}`, label: home.name }]} />
      <WallForm action={addWallToHome} target={{ homeId: home.id }} units={units} today={dayIn(home.timeZone, new Date())} values={values} submit="Add the wall" />
    </main>
  );
}
