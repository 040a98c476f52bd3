import { type FadeWall } from '@/components/drawings/fade-strip';
import { type HousePlanWall } from '@/components/drawings/house-plan';
import { type FilmLife, type WorkItem, type WorkState } from '@/lib/care/types';
import { type CalendarDay } from '@/lib/calendar';
import { type WorkKind } from '@/lib/schemas/vocabulary';

type Wall = { id: string; name: string; azimuthDeg: number; widthM: number; eaveDepthM: number; colorHex: string };
type Planned = { wall: Wall; exposure: { doseKwhM2: number } | null; coat: FilmLife; seal: FilmLife; items: readonly WorkItem[] };
type Work = { kind: WorkKind; doneOn: CalendarDay; wallIds: readonly string[]; colorHex: string | null };

const wallAddress = (homeId: string, wallId: string) => `/homes/${homeId}/walls/${wallId}`;

/** Walls for the house plan. Only restains and recaulks mark a wall: the yearly rounds come to all of them. */
export function planWalls(homeId: string, walls: readonly Planned[], stateOf: (item: WorkItem) => WorkState): HousePlanWall[] {
  const urgency: WorkState[] = ['overdue', 'due', 'due soon'];
  return walls.map(({ wall, exposure, items }) => {
    const states = items.filter(({ kind }) => kind === 'restain' || kind === 'recaulk').map(stateOf);
    return {
      id: wall.id,
      name: wall.name,
      azimuthDeg: wall.azimuthDeg,
      widthM: wall.widthM,
      eaveDepthM: wall.eaveDepthM,
      doseKwhM2: exposure?.doseKwhM2 ?? 0,
      state: urgency.find((state) => states.includes(state)),
      href: wallAddress(homeId, wall.id),
    };
  });
}

/** Walls for the fade strips: coats in the colour that was put on last. */
export function fadeWalls(homeId: string, walls: readonly Planned[], records: readonly Work[]): FadeWall[] {
  return walls.map(({ wall, coat, seal, items }) => {
    const own = records.filter((record) => record.wallIds.includes(wall.id));
    return {
      id: wall.id,
      name: wall.name,
      href: wallAddress(homeId, wall.id),
      colorHex: own.find((record) => record.kind === 'restain' && record.colorHex)?.colorHex ?? wall.colorHex,
      coat: { startedOn: coat.startedOn, lifeMonths: coat.lifeMonths },
      seal: { startedOn: seal.startedOn, lifeMonths: seal.lifeMonths },
      past: own.map(({ kind, doneOn }) => ({ kind, doneOn })),
      coming: items.map(({ kind, window }) => ({ kind, opensOn: window.opensOn, closesOn: window.closesOn })),
    };
  });
}
