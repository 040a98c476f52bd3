import 'server-only';
import { cache } from 'react';
import { requireActor } from '@/app/_server/actor';
import { pageData } from '@/app/_server/page-data';
import { homeView } from '@/db/queries/home-view';

/** The contractor and a home that is shared with them, read once a request; otherwise the not-found page. */
export const sharedHome = cache(async (homeId: string) => {
  const actor = await requireActor(['contractor']);
  return { actor, view: pageData(() => homeView(actor, homeId)) };
});
