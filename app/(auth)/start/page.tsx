import { redirect } from 'next/navigation';
import { homePageOf, requireActor } from '@/app/_server/actor';

/** Where each role begins. */
export default async function StartPage() {
  const actor = await requireActor();
  redirect(homePageOf(actor.role));
}
