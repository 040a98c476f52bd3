import { type CalendarDay } from '@/lib/calendar';
import { coatLife, type Life, sealLife } from '@/lib/coat';
import { type FilmSeen, learnedFactor } from '@/lib/coat/learning';
import { assumedStart, filmSpans, lastFound, seenFilm, type Sighting } from './film-spans';
import { lifeExplained } from './learned-words';
import { type CareFinding, type CareHome, type CareRecord, type CareWall, type FilmLife } from './types';

/** A wall with what is on it now, its two films, and the work done on it, oldest first. */
export type KnownWall = { wall: CareWall; records: CareRecord[]; coat: FilmLife; seal: FilmLife };

/** By day; records of one day by id, so that the order of logging never matters. */
const byDay = (a: CareRecord, b: CareRecord) => (a.doneOn < b.doneOn || (a.doneOn === b.doneOn && a.id < b.id) ? -1 : 1);

/** The wall with the finish and sealant of its latest work, where that work names them. */
function asItStands(wall: CareWall, records: CareRecord[]): CareWall {
  const [restained, recaulked] = (['restain', 'recaulk'] as const).map((kind) => {
    const ofKind = records.filter((record) => record.kind === kind);
    return ofKind.filter(({ doneOn }) => doneOn === ofKind.at(-1)?.doneOn);
  }) as [CareRecord[], CareRecord[]];
  return {
    ...wall,
    finish: restained.findLast(({ finish }) => finish)?.finish ?? wall.finish,
    stainBase: restained.findLast(({ stainBase }) => stainBase)?.stainBase ?? wall.stainBase,
    sealant: recaulked.findLast(({ sealant }) => sealant)?.sealant ?? wall.sealant,
  };
}

type Film = {
  film: 'coat' | 'seal';
  renewedBy: 'restain' | 'recaulk';
  /** Life of the film on a wall as it stood then. */
  life: (wall: CareWall, factor: number) => Life;
};

function filmOf({ film, renewedBy, life }: Film, wall: CareWall, records: CareRecord[], findings: readonly CareFinding[]): FilmLife {
  const sightings = findings.flatMap(({ on, [film]: state }): Sighting[] => (state ? [{ on, state }] : []));
  const { before, spans } = filmSpans(records.filter(({ kind }) => kind === renewedBy).map(({ doneOn }) => doneOn), sightings);
  const modelMonths = (startedOn: CalendarDay) => life(asItStands(wall, records.filter(({ doneOn }) => doneOn <= startedOn)), 1).months;
  const seen = spans.map((span) => seenFilm(span, modelMonths(span.startedOn))).filter((one): one is FilmSeen => one !== null);
  const { factor, steps } = learnedFactor(seen);
  const { months, ...facts } = life(asItStands(wall, records), factor);
  const last = spans.at(-1);
  const startedOn = last?.startedOn ?? assumedStart(before, months);
  const known = { film, startedOn, lifeMonths: months, ...facts, factor, learned: steps, assumed: !last && startedOn !== null, found: lastFound(last ? last.sightings : before) };
  return { ...known, explanation: lifeExplained(known) };
}

/** What is on a wall of a home, how long it lasts, and what was learned of it. */
export function knownWall(home: CareHome, drawn: CareWall): KnownWall {
  const records = home.records.filter((record) => record.wallIds.includes(drawn.id)).sort(byDay);
  const findings = home.findings.filter(({ wallId }) => wallId === drawn.id);
  const { scheffer } = home;
  return {
    wall: asItStands(drawn, records),
    records,
    coat: filmOf({ film: 'coat', renewedBy: 'restain', life: (wall, factor) => coatLife({ ...wall, scheffer, factor }) }, drawn, records, findings),
    seal: filmOf({ film: 'seal', renewedBy: 'recaulk', life: (wall, factor) => sealLife({ ...wall, scheffer, factor }) }, drawn, records, findings),
  };
}
