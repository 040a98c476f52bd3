import { addDays, type CalendarDay } from '@/lib/calendar';
import { exactDay, exactRange, monthNames } from '@/lib/calendar-words';
import { type Source } from '@/lib/explain';
import { ourRule } from '@/lib/our-rules';
import { workKinds } from '@/lib/schemas/vocabulary';
import { firstLook, isUnknown, unknownWords } from './first-look';
import { type KnownWall } from './films';
import { withSafeDay, yearlyRule } from './rule-build';
import { type CareHome, type CareRecord, type OwnRule, type SeasonMonths, type WorkItem } from './types';
import { workKey } from './work-key';
import { type Turn, turnsOf, turnToAsk } from './yearly-turns';

type YearlyKind = 'wash' | 'walkaround';

/** A walkaround up to this many days before its month counts for it. Our rule. */
const earlyDays = 30;
/** Spring and fall. */
const walkaroundMonths = [4, 10];

/**
 * The month of the yearly wash: the first month of the coating season where that is in spring (March to June, south of the
 * equator September to December), else April or October. Our rule.
 */
export function washMonth(latitude: number, seasons: SeasonMonths[]): number {
  const spring = latitude < 0 ? { from: 9, to: 12, middle: 10 } : { from: 3, to: 6, middle: 4 };
  return seasons.map(({ fromMonth }) => fromMonth).find((month) => month >= spring.from && month <= spring.to) ?? spring.middle;
}

const sources: Record<YearlyKind, Source[]> = {
  wash: [
    { text: 'A wash every year, before the work of the season: common practice, no source', ground: 'common practice' },
    ourRule('wash with the coat'),
  ],
  walkaround: [{ text: 'A walkaround in spring and in fall: common practice, no source', ground: 'common practice' }],
};

const reasons: Record<YearlyKind, string> = {
  wash: 'A wash every spring keeps dirt and mildew off the coat.',
  walkaround: 'A look at coat and caulk every spring and fall finds trouble while it is small.',
};

type Rules = { rule: string; startOn: CalendarDay; own: OwnRule | undefined };

function rulesFor(home: CareHome, known: KnownWall, kind: YearlyKind): Rules {
  const own = home.ownRules.find((rule) => rule.wallId === known.wall.id && rule.kind === kind);
  if (own) return { rule: withSafeDay(own.rule, own.startOn), startOn: own.startOn, own };
  const months = kind === 'wash' ? [washMonth(home.latitude, home.seasons[known.wall.stainBase].seasons)] : walkaroundMonths;
  return { rule: yearlyRule(months), startOn: `${home.since.slice(0, 8)}01`, own };
}

/** Whether logged work settles a turn: work from its beginning until the next one's; for the yearly wash, also any in its year. */
function isSettled(kind: YearlyKind, records: CareRecord[], own: OwnRule | undefined, turn: Turn, next: Turn | undefined): boolean {
  const early = kind === 'walkaround' && !own ? earlyDays : 0;
  const from = addDays(turn.window.opensOn, -early);
  const until = next?.window.opensOn ?? null;
  return records.some(({ kind: done, doneOn }) => {
    if (done !== kind && !(kind === 'wash' && done === 'restain')) return false;
    return (doneOn >= from && (until === null || doneOn < until)) || (kind === 'wash' && !own && doneOn.slice(0, 4) === turn.dueOn.slice(0, 4));
  });
}

/** The wash or walkaround to ask for on a wall. */
export function yearlyWork(home: CareHome, known: KnownWall, kind: YearlyKind, today: CalendarDay): WorkItem | null {
  const { rule, startOn, own } = rulesFor(home, known, kind);
  const unknown = kind === 'walkaround' && isUnknown(home, known);
  const regular = turnsOf(rule, startOn, home.since, today);
  const turns = unknown && !own ? firstLook(home.since, regular) : regular;
  const isPutOff = ({ dueOn }: Turn) => home.deferrals.some((deferral) => deferral.workKey === workKey({ wallId: known.wall.id, kind, startOn: null, dueOn }));
  const turn = turnToAsk(turns, (one, next) => isPutOff(one) || isSettled(kind, known.records, own, one, next), today);
  if (!turn) return null;
  const byRule = regular.some(({ dueOn }) => dueOn === turn.dueOn);
  const reason = unknown ? unknownWords(home, known) : own ? `The owner’s own rule falls on ${exactDay(turn.dueOn)}.` : reasons[kind];
  return {
    wallId: known.wall.id,
    kind,
    rule: byRule ? rule : null,
    startOn: byRule ? startOn : null,
    ...turn,
    basis: unknown ? 'date not known' : own ? 'own rule' : 'computed',
    missedOn: null,
    lifeMonths: null,
    because: reason,
    explanation: {
      figure: `Next ${workKinds[kind].toLowerCase()} of this wall`,
      value: exactRange(turn.window.opensOn, turn.window.closesOn),
      formula: byRule ? 'the month of the care rule’s next date that logged work has not settled' : 'the 30 days after the home was set up',
      inputs: byRule ? [{ label: 'Care rule (RFC 5545)', value: rule }, { label: 'Month', value: monthNames[Number(turn.dueOn.slice(5, 7)) - 1] ?? '' }] : [{ label: 'Set up on', value: exactDay(home.since) }],
      sources: unknown ? [...sources.walkaround, ourRule('first look')] : sources[kind],
    },
  };
}
