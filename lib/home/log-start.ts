import { type WorkItem } from '@/lib/care/types';
import { type CalendarDay } from '@/lib/calendar';
import { workGroups } from '@/lib/home/next-work';
import { workKinds, type WorkKind } from '@/lib/schemas/vocabulary';

type Asked = { kind?: string | string[] | undefined; wall?: string | string[] | undefined };

export const isKind = (kind: unknown): kind is WorkKind => typeof kind === 'string' && Object.hasOwn(workKinds, kind);

/** What a log form begins with: the kind and walls that its address names, else the work that presses most. */
export function logStart(asked: Asked, items: readonly WorkItem[], walls: readonly { id: string; name: string }[], today: CalendarDay): { kind: WorkKind; chosen: string[] } {
  const [next] = workGroups(items, walls, today);
  const kind = isKind(asked.kind) ? asked.kind : (next?.kind ?? 'restain');
  if (asked.wall) return { kind, chosen: [asked.wall].flat() };
  return { kind, chosen: kind === next?.kind ? next.walls.map(({ id }) => id) : [] };
}

/** The work that an address names as just put off, if it still is: for undoing it. */
export function justPutOff(asked: Asked, stands: readonly { wallId: string; kind: WorkKind }[]): { kind: WorkKind; wallIds: string[] } | null {
  const { kind } = asked;
  if (!isKind(kind)) return null;
  const wallIds = [asked.wall ?? []].flat().filter((id) => stands.some((one) => one.kind === kind && one.wallId === id));
  return wallIds.length > 0 ? { kind, wallIds } : null;
}
