import { type Metadata } from 'next';
import { pageData, pageHome } from '@/app/_server/page-data';
import { whatWasSaid } from '@/app/_server/said';
import { Said } from '@/components/home/said';
import { ShareForm } from '@/components/home/share-form';
import { Confirm } from '@/components/ui/confirm';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { membersOf } from '@/db/queries/sharing';
import { dayIn } from '@/lib/calendar';
import { exactDay } from '@/lib/calendar-words';
import { can } from '@/lib/permissions';
import { memberships } from '@/lib/schemas/vocabulary';
import { share, withdraw } from './actions';

export const metadata: Metadata = { title: 'Share' };

type Props = { params: Promise<{ homeId: string }> };

export default async function SharePage({ params }: Props) {
  const { actor, view } = await pageHome((await params).homeId);
  const { home, membership } = view;
  const members = pageData(() => membersOf(actor, home.id));
  const mayShare = can(actor, 'home.share', { membership });
  return (
    <main id="main">
      <PageHead title="Who can see this home" path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${home.id}`, label: home.name }]} />
      <Said words={await whatWasSaid()} />
      <ul>
        {members.map((member) => (
          <li key={member.userId} className="course">
            <div className="within flex flex-wrap items-center justify-between gap-x-8 gap-y-2 py-5">
              <div>
                <p className="text-lg font-semibold">
                  {member.name ?? member.email}
                  {member.userId === actor.id ? ' (you)' : ''}
                </p>
                <p className="text-quiet">
                  {[memberships[member.membership], member.company, mayShare ? member.email : null, `since ${exactDay(dayIn(home.timeZone, member.since))}`].filter(Boolean).join(' · ')}
                </p>
              </div>
              {mayShare && member.membership !== 'owner' ? (
                <Confirm label="End access" question={`End the access of ${member.name ?? member.email} to ${home.name}?`} confirm="End the access" action={withdraw} fields={{ homeId: home.id, userId: member.userId }}>
                  <p>They no longer see the home. What they logged stays in its record. You can share it again at any time.</p>
                </Confirm>
              ) : null}
            </div>
          </li>
        ))}
      </ul>
      <Course heading="Share with somebody" aside="They see this home only, none of your others.">
        {mayShare ? <ShareForm action={share} homeId={home.id} /> : <p>Only the owner shares a home. Ask them to enter the address of the person who should see it.</p>}
      </Course>
    </main>
  );
}
