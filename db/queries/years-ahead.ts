import { type CalendarDay } from '@/lib/calendar';
import { planHome } from '@/lib/care';
import { type Budget, budget } from '@/lib/care/budget';
import { type Grouping } from '@/lib/care/grouping';
import { type CareHome } from '@/lib/care/types';
import { type Actor } from '@/lib/permissions';
import { transaction } from '../client';
import { homeFor } from '../scope';
import { careHomeAt } from './care-home';
import { costsSetAt } from './costs';

export type YearsAheadView = {
  home: CareHome;
  today: CalendarDay;
  grouping: Grouping;
  budget: Budget;
  /** Null while the prices are our examples. */
  pricesSetAt: Date | null;
};

/** What a home's walls will cost, year by year, and how its walls share trips, for whoever may see the home. Throws `Refused`. */
export function homeYearsAhead(actor: Actor, homeId: string, now: Date): YearsAheadView {
  homeFor(actor, homeId, 'home.view');
  return transaction(() => {
    const { home, today } = careHomeAt(homeId, now);
    const { walls, grouping } = planHome(home, today);
    return { home, today, grouping, budget: budget(home, walls, grouping, today), pricesSetAt: costsSetAt(homeId) };
  });
}
