import { z } from 'zod';
import { type CalendarDay } from '@/lib/calendar';
import { aboutRange, exactDay, exactRange, fromToday } from '@/lib/calendar-words';
import { cautionsDefer, cautionsFor } from '@/lib/cautions';
import { keysOf, memberships, sealants, stainBases, unitSystems, workKinds } from '@/lib/schemas/vocabulary';
import { areaText } from '@/lib/units';
import { type Course, defineMail, type Part } from '../letter';
import { byUrgency, reminderStages, stageWords } from './reminder-stages';

const item = z.object({
  kind: z.enum(keysOf(workKinds)),
  stage: z.enum(keysOf(reminderStages)),
  dueOn: z.iso.date(),
  opensOn: z.iso.date(),
  closesOn: z.iso.date(),
  /** The owner's own rule sets the day, not the life of the film. */
  ownRule: z.boolean(),
  because: z.string(),
  logUrl: z.url(),
  /** Links that work without sign-in, for this piece of work only; null where the person may not put work off. */
  putOffUrl: z.url().nullable(),
  stopUrl: z.url(),
});
export type ReminderItem = z.output<typeof item>;

const wall = z.object({ name: z.string().min(1), areaM2: z.number().nonnegative(), items: z.array(item) });

/** Walls in plan order, also those with nothing to do: every wall keeps its place. */
export const reminderProps = z.object({
  homeName: z.string().min(1),
  personName: z.string().nullable(),
  membership: z.enum(keysOf(memberships)),
  units: z.enum(keysOf(unitSystems)),
  today: z.iso.date(),
  yearBuilt: z.number().int().nullable(),
  /** Of the walls that have something to do. */
  stainBases: z.array(z.enum(keysOf(stainBases))),
  sealants: z.array(z.enum(keysOf(sealants))),
  walls: z.array(wall).min(1),
  planUrl: z.url(),
  accountUrl: z.url(),
});
export type ReminderProps = z.output<typeof reminderProps>;

export const reminderMail = defineMail({
  kind: 'reminder',
  props: reminderProps,
  queued: z.object({}),
  write: (props) => {
    const items = props.walls.flatMap((of) => of.items.map((it) => ({ ...it, wallName: of.name })));
    const [first] = [...items].sort(byUrgency);
    if (!first) throw new RangeError('a reminder with nothing to say');
    const more = items.length > 1 ? ` and ${items.length - 1} more` : '';
    return {
      subject: `${props.homeName}: ${stageWords(first.stage, first.kind, first.opensOn > props.today).inSubject} (${first.wallName})${more}`,
      heading: `${props.homeName}: what is next`,
      courses: [opening(props, items.length), ...props.walls.map((of) => wallCourse(of, props)), cautionCourse(props, items.map((it) => it.kind))],
      footer: footer(props),
    };
  },
});

function opening(props: ReminderProps, count: number): Course {
  const walls = props.walls.filter((of) => of.items.length > 0).length;
  const greeting = props.personName ? `${props.personName}, ` : '';
  const things = count === 1 ? 'one piece of work' : `${count} pieces of work`;
  const where = walls === 1 ? 'one wall' : `${walls} walls`;
  return {
    parts: [
      { as: 'text', text: `${greeting}${things} on ${where} of ${props.homeName} ${count === 1 ? 'wants' : 'want'} your attention. Dates are calendar days at the home.` },
      { as: 'link', label: `Open the plan of ${props.homeName}`, url: props.planUrl, look: 'button' },
    ],
  };
}

function wallCourse(of: ReminderProps['walls'][number], props: ReminderProps): Course {
  const title = { title: of.name, aside: areaText(of.areaM2, props.units) };
  if (of.items.length === 0) return { ...title, parts: [{ as: 'text', text: 'Nothing new in this reminder.', look: 'quiet' }] };
  const overdue = of.items.some((it) => it.stage === 'overdue');
  return { ...title, mark: overdue ? 'overdue' : 'due soon', parts: [...of.items].sort(byUrgency).flatMap((it) => itemParts(it, props.today)) };
}

function itemParts(it: ReminderItem, today: CalendarDay): Part[] {
  const words = stageWords(it.stage, it.kind, it.opensOn > today);
  return [
    { as: 'text', text: `${workKinds[it.kind]}: ${words.headline}`, look: it.stage === 'overdue' ? 'overdue' : 'due soon' },
    { as: 'text', text: words.advice },
    { as: 'fact', label: 'When', text: `${aboutRange(it.opensOn, it.closesOn)} (${exactRange(it.opensOn, it.closesOn)})` },
    { as: 'fact', label: filmEnds(it) ? 'Used up' : 'Due', text: `${exactDay(it.dueOn)}, ${fromToday(it.dueOn, today)}` },
    { as: 'fact', label: 'Why', text: it.because },
    { as: 'link', label: `Already done? Log this ${workKinds[it.kind].toLowerCase()}`, url: it.logUrl },
    ...(it.putOffUrl ? [{ as: 'link', label: 'Put it off to its next season', url: it.putOffUrl } satisfies Part] : []),
    { as: 'link', label: 'Stop reminding me of it', url: it.stopUrl },
  ];
}

/** The day on which coat or caulk is used up; other work is simply due on its day. */
const filmEnds = (it: ReminderItem) => !it.ownRule && (it.kind === 'restain' || it.kind === 'recaulk');

function cautionCourse(props: ReminderProps, kinds: ReminderItem['kind'][]): Course {
  const list = cautionsFor({ kinds, yearBuilt: props.yearBuilt, stainBases: props.stainBases, sealants: props.sealants });
  return {
    title: 'Where people get hurt',
    parts: [
      ...list.map((caution): Part => ({ as: 'fact', label: caution.hazard, text: `${caution.text} (${caution.authority})` })),
      { as: 'text', text: cautionsDefer, look: 'strong' },
    ],
  };
}

const footer = (props: ReminderProps): Part[] => [
  { as: 'text', text: `You get this because you are ${props.membership === 'owner' ? 'the owner' : `a ${memberships[props.membership].toLowerCase()}`} of ${props.homeName} on Eavewright and have reminders turned on.` },
  { as: 'link', label: 'Turn reminders off or change your address', url: props.accountUrl },
];

