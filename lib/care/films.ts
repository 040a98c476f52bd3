import { type CalendarDay } from '@/lib/calendar';
import { coatLife, sealLife } from '@/lib/coat';
import { type CareHome, type CareRecord, type CareWall, type FilmLife } from './types';

/** A wall with what is on it now, its two films, and the work done on it, oldest first. */
export type KnownWall = { wall: CareWall; records: CareRecord[]; coat: FilmLife; seal: FilmLife };

/** By day; records of one day by id, so that the order of logging never matters. */
const byDay = (a: CareRecord, b: CareRecord) => (a.doneOn < b.doneOn || (a.doneOn === b.doneOn && a.id < b.id) ? -1 : 1);

/** The day a kind of work was last done on the wall. */
export const lastDone = (records: CareRecord[], kind: CareRecord['kind']): CalendarDay | null =>
  records.findLast((record) => record.kind === kind)?.doneOn ?? null;

/** The wall with the finish and sealant of its latest work, where that work names them. */
function asItStands(wall: CareWall, records: CareRecord[]): CareWall {
  const [restained, recaulked] = (['restain', 'recaulk'] as const).map((kind) => {
    const last = lastDone(records, kind);
    return records.filter((record) => record.kind === kind && record.doneOn === last);
  }) as [CareRecord[], CareRecord[]];
  return {
    ...wall,
    finish: restained.findLast(({ finish }) => finish)?.finish ?? wall.finish,
    stainBase: restained.findLast(({ stainBase }) => stainBase)?.stainBase ?? wall.stainBase,
    sealant: recaulked.findLast(({ sealant }) => sealant)?.sealant ?? wall.sealant,
  };
}

const nothingLearned = { factor: 1, learned: [], assumed: false, found: null };

/** What is on a wall of a home and how long it lasts. */
export function knownWall(home: CareHome, drawn: CareWall): KnownWall {
  const records = home.records.filter((record) => record.wallIds.includes(drawn.id)).sort(byDay);
  const wall = asItStands(drawn, records);
  const { months: coatMonths, ...coat } = coatLife({ ...wall, scheffer: home.scheffer });
  const { months: sealMonths, ...seal } = sealLife({ ...wall, scheffer: home.scheffer });
  return {
    wall,
    records,
    coat: { ...nothingLearned, film: 'coat', startedOn: lastDone(records, 'restain'), lifeMonths: coatMonths, ...coat },
    seal: { ...nothingLearned, film: 'seal', startedOn: lastDone(records, 'recaulk'), lifeMonths: sealMonths, ...seal },
  };
}
