import 'server-only';
import { forbidden, notFound } from 'next/navigation';
import { cache } from 'react';
import { type HomeView, homeView, type PlannedWall } from '@/db/queries/home-view';
import { type Actor, Refused } from '@/lib/permissions';
import { requireActor } from './actor';

/** Reads for a page: what is out of the actor's scope becomes the not-found page, what the policy refuses a calm 403 page. */
export function pageData<T>(read: () => T): T {
  try {
    return read();
  } catch (error) {
    if (!(error instanceof Refused)) throw error;
    return error.reason === 'not found' ? notFound() : forbidden();
  }
}

/** The homeowner and one of their homes, read once a request. */
export const pageHome = cache(async (homeId: string): Promise<{ actor: Actor; view: HomeView }> => {
  const actor = await requireActor(['homeowner']);
  return { actor, view: pageData(() => homeView(actor, homeId)) };
});

/** One standing wall of that home, planned; otherwise the not-found page. */
export const pageWall = cache(async (homeId: string, wallId: string): Promise<PlannedWall> => {
  const { view } = await pageHome(homeId);
  return view.walls.find(({ wall }) => wall.id === wallId) ?? notFound();
});
