import { type CalendarDay } from '@/lib/calendar';
import { type Explanation } from '@/lib/explain';
import { type WorkCosts } from './costs';
import { type Grouping } from './grouping';
import { type LearnedStep } from '@/lib/coat/learning';
import { type FilmState, type Finish, type Sealant, type StainBase, type Texture, type WorkKind, type Wood } from '@/lib/schemas/vocabulary';
import { type WallCover } from '@/lib/sun';

/** One wall as the care rules see it. Lengths in m, areas in m², dose in kWh/m² a year. */
export type CareWall = {
  id: string;
  name: string;
  position: number;
  azimuthDeg: number;
  heightM: number;
  eaveDepthM: number;
  /** A porch roof or a deck above. */
  cover?: WallCover | undefined;
  weatherSide: boolean;
  /** Flat area of wood. */
  areaM2: number;
  /** Length of the joints that take caulk. */
  jointM: number;
  finish: Finish;
  stainBase: StainBase;
  texture: Texture;
  wood: Wood;
  sealant: Sealant;
  /** From the stored exposure; never computed here. */
  doseKwhM2: number;
};

/** A logged (or recalled at set-up) piece of work; removed records are not passed in. */
export type CareRecord = {
  id: string;
  kind: WorkKind;
  doneOn: CalendarDay;
  wallIds: string[];
  /** Finish or sealant put on, when it differs from what the wall has. */
  finish?: Finish | undefined;
  stainBase?: StainBase | undefined;
  sealant?: Sealant | undefined;
};

/** How a wall's films were found on a day: on a walkaround, or just before they were renewed. */
export type CareFinding = { wallId: string; recordId: string; on: CalendarDay; coat: FilmState | null; seal: FilmState | null };

/** A piece of work (`workKey`) that somebody put off until a day. */
export type CareDeferral = { workKey: string; notBefore: CalendarDay };

/** An owner's own rule in place of the computed one. */
export type OwnRule = { wallId: string; kind: WorkKind; rule: string; startOn: CalendarDay };

/** A run of months (1–12, both ends included; may wrap the year end) in which a coat can cure. */
export type SeasonMonths = { fromMonth: number; toMonth: number };

export type CareHome = {
  id: string;
  latitude: number;
  scheffer: number;
  /** Coating seasons by stain base; empty when no month is good (then `bestMonths` stands in, with a warning). */
  seasons: Record<StainBase, { seasons: SeasonMonths[]; warning?: string | undefined }>;
  /** When the home was set up: start of yearly rules that have never been done. */
  since: CalendarDay;
  walls: CareWall[];
  records: CareRecord[];
  findings: CareFinding[];
  deferrals: CareDeferral[];
  ownRules: OwnRule[];
  costs: WorkCosts;
};

export type Window = {
  opensOn: CalendarDay;
  closesOn: CalendarDay;
  /** How the window came out of the raw date. */
  moved: 'in season' | 'to the season before' | 'to the next season' | 'to the coming season' | 'no season' | 'put off' | 'to a visit';
};

/** The next work of one kind on one wall, as stored. Nothing in it depends on today except through `lapsesOn`. */
export type WorkItem = {
  wallId: string;
  kind: WorkKind;
  /** RFC 5545 rule text (without DTSTART) and its start; null when there is nothing to start from. */
  rule: string | null;
  startOn: CalendarDay | null;
  /** The rule's raw date: the day the film is used up, or the yearly day. */
  dueOn: CalendarDay;
  window: Window;
  /** The day on which an earlier window closed without the work; null while none has. Such work is overdue. */
  missedOn: CalendarDay | null;
  /** The home is planned anew on this day: yearly work that nobody did gives way to the next, film work moves to the coming season. */
  lapsesOn: CalendarDay | null;
  /** 'walkaround first' when a date is not known. */
  basis: 'computed' | 'own rule' | 'date not known' | 'pulled to the restain' | 'found' | 'put off' | 'joined to a visit';
  lifeMonths: number | null;
  /** One plain sentence: why this work, why then. */
  because: string;
  explanation: Explanation;
};

/** A wall's coat or seal: when it began, how long it is expected to last. */
export type FilmLife = {
  film: 'coat' | 'seal';
  startedOn: CalendarDay | null;
  lifeMonths: number;
  lowYears: number;
  highYears: number;
  /** 0 (gentlest published life) to 1 (hardest). */
  severity: number;
  /** The wall's own factor k on the modelled life, 0.5–2; 1 when nothing has been learned. */
  factor: number;
  /** What earlier films of the wall taught, oldest first. */
  learned: LearnedStep[];
  /** True when nobody knows the day and `startedOn` was reckoned back from how the film was found. */
  assumed: boolean;
  /** How the film that is on the wall was last found, if it was looked at. */
  found: { state: FilmState; on: CalendarDay } | null;
  explanation: Explanation;
};

export type WallPlan = {
  wallId: string;
  coat: FilmLife;
  seal: FilmLife;
  items: WorkItem[];
};

/** What falls on one home in one window, offered as one trip. */
export type Visit = { opensOn: CalendarDay; closesOn: CalendarDay; items: WorkItem[] };

export type HomePlan = { homeId: string; walls: WallPlan[]; visits: Visit[]; grouping: Grouping };

/** How an item stands on a given day. */
export type WorkState = 'later' | 'due soon' | 'due' | 'overdue';
