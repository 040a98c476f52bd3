import { type Metadata } from 'next';
import { pageData, pageHome } from '@/app/_server/page-data';
import { WallForm } from '@/components/home/wall-form';
import { Confirm } from '@/components/ui/confirm';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { recalledDays } from '@/db/queries/recalled';
import { unitsOf } from '@/db/queries/units';
import { wallOf, wallsOfHome } from '@/db/queries/walls';
import { dayIn } from '@/lib/calendar';
import { coverValues, openingValues, wallLengths } from '@/lib/home/form-values';
import { saveWall, takeOutWall } from '../../actions';

export const metadata: Metadata = { title: 'Edit a wall' };

type Props = { params: Promise<{ homeId: string; wallId: string }> };

export default async function EditWallPage({ params }: Props) {
  const { homeId, wallId } = await params;
  const { actor, view } = await pageHome(homeId);
  const { home, wall } = pageData(() => wallOf(actor, homeId, wallId, 'home.edit'));
  const openings = wallsOfHome(homeId).find((one) => one.wall.id === wallId)?.openings ?? [];
  const units = unitsOf(actor);
  const logged = (kind: 'restain' | 'recaulk') => view.records.find((record) => record.kind === kind && record.origin === 'logged' && record.wallIds.includes(wallId))?.doneOn;
  const { name, shade, shadeHeightDeg, weatherSide, corners, pipes, finish, stainBase, colorHex, colorName, texture, sealant } = wall;
  const values = { name, shade, shadeHeightDeg, weatherSide, corners, pipes, cover: coverValues(wall, units), ...wallLengths(wall, units), openings: openingValues(openings, units), coat: { finish, stainBase, colorHex, colorName: colorName ?? '', texture, sealant }, ...recalledDays(wallId), logged: { restain: logged('restain'), recaulk: logged('recaulk') } };
  const target = { homeId, wallId };
  return (
    <main id="main">
      <PageHead title={`Edit ${name}`} path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${homeId}`, label: home.name }, { href: `/homes/${homeId}/walls/${wallId}`, label: name }]} />
      <WallForm action={saveWall} target={target} units={units} today={dayIn(home.timeZone, new Date())} values={values} submit="Save the wall" />
      <Course heading="Take it out" tone="quiet">
        <p className="mb-3 max-w-prose">For a wall that was built over or entered twice. Its history is kept, and it can be brought back.</p>
        <Confirm label="Take this wall out" look="quiet" question={`Take ${name} out of ${home.name}?`} confirm="Take it out" action={takeOutWall} fields={target}>
          <p>It leaves the plan and the reminders. Its history is kept; you can bring it back.</p>
        </Confirm>
      </Course>
    </main>
  );
}
