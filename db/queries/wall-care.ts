import { type CalendarDay } from '@/lib/calendar';
import { type CareHome } from '@/lib/care/types';
import { type Actor } from '@/lib/permissions';
import { careHomeAt } from './care-home';
import { wallOf } from './walls';

/** The home of a wall as the care rules take it, for whoever may change the wall's rules. Throws `Refused`. */
export function careOfWall(actor: Actor, homeId: string, wallId: string, now: Date): { home: CareHome; today: CalendarDay } {
  wallOf(actor, homeId, wallId, 'home.edit');
  const { home, today } = careHomeAt(homeId, now);
  return { home, today };
}
