import { type CalendarDay } from '@/lib/calendar';
import { exactDay } from '@/lib/calendar-words';

type Remembered = { stained: CalendarDay | null; caulked: CalendarDay | null };

const words = (day: CalendarDay, today: CalendarDay) => `${exactDay(day)} has not come yet: today is ${exactDay(today)} at the home.`;

/** What is wrong with remembered days that lie after today, by form field; null when nothing is. */
export function notYet({ stained, caulked }: Remembered, today: CalendarDay): Record<string, string> | null {
  const errors: Record<string, string> = {};
  if (stained && stained > today) errors['stained.on'] = words(stained, today);
  if (caulked && caulked > today) errors['caulked.on'] = words(caulked, today);
  return Object.keys(errors).length > 0 ? errors : null;
}

export const dayNotYet = words;
