import { type Metadata } from 'next';
import { pageData, pageHome } from '@/app/_server/page-data';
import { EditHomeForm } from '@/components/home/edit-home-form';
import { TurnForm } from '@/components/home/turn-form';
import { Confirm } from '@/components/ui/confirm';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { homeOf } from '@/db/queries/homes';
import { findPostalCode } from '@/db/queries/places';
import { unitsOf } from '@/db/queries/units';
import { homeValues } from '@/lib/home/form-values';
import { can } from '@/lib/permissions';
import { archive } from '../../actions';
import { saveHome, turnHome } from './actions';

export const metadata: Metadata = { title: 'Edit a home' };

type Props = { params: Promise<{ homeId: string }> };

export default async function EditHomePage({ params }: Props) {
  const { actor, view } = await pageHome((await params).homeId);
  const { home, membership } = pageData(() => homeOf(actor, view.home.id, 'home.edit'));
  const units = unitsOf(actor);
  return (
    <main id="main">
      <PageHead title={`Edit ${home.name}`} path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${home.id}`, label: home.name }]} />
      <EditHomeForm action={saveHome} homeId={home.id} units={units} values={homeValues(home, findPostalCode(home.postalCode), units)} />
      <Course heading="Turn the house" aside="Every wall turns with it, and its sun is worked out anew.">
        <TurnForm action={turnHome} homeId={home.id} compassDeg={home.compassDeg} walls={view.walls.map(({ wall }) => ({ name: wall.name, azimuthDeg: wall.azimuthDeg }))} />
      </Course>
      {can(actor, 'home.archive', { membership }) ? (
        <Course heading="Archive" tone="quiet">
          <p className="mb-3 max-w-prose">For a home that you sold or no longer look after. It leaves every list and its reminders stop. Nothing is deleted.</p>
          <Confirm label="Archive this home" look="quiet" question={`Archive ${home.name}?`} confirm="Archive it" action={archive} fields={{ homeId: home.id }}>
            <p>It leaves your list and the lists of everybody it is shared with. You can bring it back right afterwards.</p>
          </Confirm>
        </Course>
      ) : null}
    </main>
  );
}
