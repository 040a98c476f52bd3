import 'server-only';
import { getServerSession } from 'next-auth';
import { type Route } from 'next';
import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { cache } from 'react';
import { activePerson } from '@/db/queries/people';
import { type Actor } from '@/lib/permissions';
import { type Role } from '@/lib/schemas/vocabulary';
import { authOptions } from './auth';

/** The signed-in person of this request, read fresh from the database; null when nobody is. */
export const currentActor = cache(async (): Promise<Actor | null> => {
  const session = await getServerSession(authOptions);
  if (!session?.user?.id) return null;
  return activePerson(session.user.id, session.signedInAt);
});

/** For pages and layouts: the actor, or off to sign-in and back. */
export async function requireActor(roles?: Role[]): Promise<Actor> {
  const actor = await currentActor();
  if (!actor) redirect(await signInAndBack());
  if (roles && !roles.includes(actor.role)) redirect(homePageOf(actor.role));
  return actor;
}

/** Where each role's work begins. */
export const homePageOf = (role: Role) => (({ homeowner: '/homes', contractor: '/work', operator: '/operator' }) as const)[role];

/** The session ended while the page was open: sign in, then on to the page that was asked for. */
async function signInAndBack(): Promise<Route> {
  const path = (await headers()).get('x-request-path');
  return path ? (`/sign-in?callbackUrl=${encodeURIComponent(path)}` as Route) : '/sign-in';
}
