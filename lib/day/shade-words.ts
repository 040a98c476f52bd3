import { type DaySpan, type WallShade } from '@/lib/sun';

/** Shorter stretches than this are not worth a word, minutes. Our rule. */
const shortest = 10;

/** '4:10 PM' to the nearest five minutes; 0 and 1440 are midnight. */
export function clockText(minute: number): string {
  const near = Math.round(minute / 5) * 5;
  if (near % 1440 === 0) return 'midnight';
  const hour = Math.floor(near / 60);
  return `${hour % 12 === 0 ? 12 : hour % 12}:${String(near % 60).padStart(2, '0')} ${hour < 12 ? 'AM' : 'PM'}`;
}

const long = ({ from, to }: DaySpan) => to - from >= shortest * 60_000;

function spanWords(span: DaySpan, daylight: DaySpan): string {
  if (span.from === daylight.from) return `until ${clockText(span.toMinute)}`;
  if (span.to === daylight.to) return `from ${clockText(span.fromMinute)}`;
  return `from ${clockText(span.fromMinute)} to ${clockText(span.toMinute)}`;
}

/** When a wall is out of the sun: 'in the shade all day', 'in the shade until 8:10 AM and from 5:00 PM', 'in the sun all day'. */
export function shadeWords({ sun, shade }: Pick<WallShade<unknown>, 'sun' | 'shade'>, daylight: DaySpan | null): string {
  if (!daylight || !sun.some(long)) return 'in the shade all day';
  const spans = shade.filter(long).map((span) => spanWords(span, daylight));
  if (spans.length === 0) return 'in the sun all day';
  return `in the shade ${[spans.slice(0, -1).join(', '), spans.at(-1)].filter(Boolean).join(' and ')}`;
}
