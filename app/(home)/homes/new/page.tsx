import { type Metadata } from 'next';
import { requireActor } from '@/app/_server/actor';
import { NewHomeForm } from '@/components/home/new-home-form';
import { PageHead } from '@/components/ui/page-head';
import { unitsOf } from '@/db/queries/units';
import { dayIn } from '@/lib/calendar';
import { create } from './actions';

export const metadata: Metadata = { title: 'Set up a home' };

/** Where today comes first among US homes: the calendar's bound until the place is known. */
const earliestZone = 'Pacific/Guam';

export default async function NewHomePage() {
  const actor = await requireActor(['homeowner']);
  return (
    <main id="main">
      <PageHead title="Set up a home" lead="About three minutes. Everything can be changed afterwards." path={[{ href: '/homes', label: 'Homes' }]} />
      <NewHomeForm action={create} units={unitsOf(actor)} today={dayIn(earliestZone, new Date())} />
    </main>
  );
}
