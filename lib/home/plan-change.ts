import { type WorkItem } from '@/lib/care/types';
import { aboutDay, monthNames } from '@/lib/calendar-words';
import { type CalendarDay, monthOf, yearOf } from '@/lib/calendar';
import { type WorkKind } from '@/lib/schemas/vocabulary';

type Named = { id: string; name: string };

const next: Record<WorkKind, string> = { restain: 'next restain', recaulk: 'next recaulk', wash: 'next wash', walkaround: 'next walkaround' };

const month = (day: CalendarDay) => `${monthNames[monthOf(day) - 1]} ${yearOf(day)}`;

/** 'from May 2027 to August 2032'; days are told apart by the third of a month where the month is the same. */
function move(from: CalendarDay, to: CalendarDay): string {
  if (month(from) !== month(to)) return `from ${month(from)} to ${month(to)}`;
  return `from ${aboutDay(from)} to ${aboutDay(to)}`;
}

/**
 * What a change did to a plan, one sentence each for the walls and kinds of work that it moved, in plan order.
 * 'Front: next restain moves from May 2027 to August 2032.'
 */
export function planChange(before: readonly WorkItem[], after: readonly WorkItem[], walls: readonly Named[]): string[] {
  return walls.flatMap((wall) =>
    (Object.keys(next) as WorkKind[]).flatMap((kind) => {
      const find = (items: readonly WorkItem[]) => items.find((item) => item.wallId === wall.id && item.kind === kind);
      const [old, now] = [find(before), find(after)];
      if (!now) return old ? [`${wall.name}: no ${kind} is planned any more.`] : [];
      if (!old) return [`${wall.name}: ${next[kind]} in ${aboutDay(now.window.opensOn)}.`];
      if (aboutDay(old.window.opensOn) === aboutDay(now.window.opensOn)) return [];
      return [`${wall.name}: ${next[kind]} moves ${move(old.window.opensOn, now.window.opensOn)}.`];
    }),
  );
}
