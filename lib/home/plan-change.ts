import { type WorkItem } from '@/lib/care/types';
import { aboutDay, monthNames } from '@/lib/calendar-words';
import { type CalendarDay, monthOf, yearOf } from '@/lib/calendar';
import { capital, wallWords } from '@/lib/home/wall-words';
import { type WorkKind } from '@/lib/schemas/vocabulary';

type Named = { id: string; name: string };

const next: Record<WorkKind, string> = { restain: 'next restain', recaulk: 'next recaulk', wash: 'next wash', walkaround: 'next walkaround' };

const month = (day: CalendarDay) => `${monthNames[monthOf(day) - 1]} ${yearOf(day)}`;

/** 'from May 2027 to August 2032'; days are told apart by the third of a month where the month is the same. */
function move(from: CalendarDay, to: CalendarDay): string {
  if (month(from) !== month(to)) return `from ${month(from)} to ${month(to)}`;
  return `from ${aboutDay(from)} to ${aboutDay(to)}`;
}

type Item = WorkItem | undefined;

/** 'next restain moves from May 2027 to August 2032', or null when nothing that is said moves. */
function sentence(kind: WorkKind, old: Item, now: Item): string | null {
  if (!now) return old ? `no ${kind} is planned any more` : null;
  if (!old) return `${next[kind]} in ${aboutDay(now.window.opensOn)}`;
  if (aboutDay(old.window.opensOn) === aboutDay(now.window.opensOn)) return null;
  return `${next[kind]} moves ${move(old.window.opensOn, now.window.opensOn)}`;
}

/**
 * What a change did to a plan: one sentence for the walls and kinds of work that it moved alike, in plan order.
 * 'Front: next restain moves from May 2027 to August 2032.'
 */
export function planChange(before: readonly WorkItem[], after: readonly WorkItem[], walls: readonly Named[]): string[] {
  const moved = new Map<string, Named[]>();
  for (const wall of walls) {
    for (const kind of Object.keys(next) as WorkKind[]) {
      const find = (items: readonly WorkItem[]) => items.find((item) => item.wallId === wall.id && item.kind === kind);
      const words = sentence(kind, find(before), find(after));
      if (words) moved.set(words, [...(moved.get(words) ?? []), wall]);
    }
  }
  return [...moved].map(([words, named]) => `${capital(wallWords(named, walls.length))}: ${words}.`);
}
