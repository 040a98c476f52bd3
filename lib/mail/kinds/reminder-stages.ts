import { type CalendarDay } from '@/lib/calendar';
import { type ReachedStage } from '@/lib/care/stages';
import { keysOf, type WorkKind, workKinds } from '@/lib/schemas/vocabulary';

/** From the most to the least urgent. */
export const reminderStages = { overdue: 0, open: 1, buy: 2, book: 3 } as const satisfies Record<ReachedStage['stage'], number>;
export type ReminderStage = keyof typeof reminderStages;

const verbs: Record<WorkKind, string> = { restain: 'restain', recaulk: 'recaulk', wash: 'wash', walkaround: 'walk around' };

type Words = { headline: string; advice: string; inSubject: string };

/** What each stage says of each kind of work; `isAhead` when its window has yet to open. */
export function stageWords(stage: ReminderStage, kind: WorkKind, isAhead: boolean): Words {
  const noun = workKinds[kind].toLowerCase();
  const look = kind === 'walkaround';
  switch (stage) {
    case 'book':
      return { headline: 'time to book', advice: 'Ask a crew for days in this window now, or set days of your own aside.', inSubject: `book the ${noun}` };
    case 'buy':
      return { headline: 'time to buy', advice: 'Buy what it takes, so that it stands ready when the window opens. The plan says how much.', inSubject: `buy for the ${noun}` };
    case 'open':
      return {
        headline: 'can be done now',
        advice: look ? 'Walk around the house and answer a few questions for this wall; the answers move its dates.' : 'The window is open. Pick a dry, mild day.',
        inSubject: `time to ${verbs[kind]}`,
      };
    case 'overdue':
      return { headline: 'overdue', advice: look ? overdueLook : isAhead ? missedSeason : nextDrySpell, inSubject: `${noun} is overdue` };
  }
}

const overdueLook = 'Nobody has logged a look at this wall this season. Its dates are surer after one.';
const missedSeason = 'It missed its season; below is the next chance, so book it in good time. Until then look at the wall and log what you find.';
const nextDrySpell = 'Do it in the next dry spell, or look at the wall and log what you find.';

type Ranked = { stage: ReminderStage; kind: WorkKind; dueOn: CalendarDay };
const kindOrder = keysOf(workKinds);

const rank = (it: Ranked) => reminderStages[it.stage] * 10 + kindOrder.indexOf(it.kind);

/** Overdue first; then restain before recaulk, wash and walkaround; then the earlier date. */
export const byUrgency = (a: Ranked, b: Ranked): number => rank(a) - rank(b) || (a.dueOn < b.dueOn ? -1 : a.dueOn > b.dueOn ? 1 : 0);

export const isReminderStage = (text: string): text is ReminderStage => text in reminderStages;
