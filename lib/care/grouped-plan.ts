import { addDays, type CalendarDay } from '@/lib/calendar';
import { aboutDay, exactRange } from '@/lib/calendar-words';
import { monthsInWords } from '@/lib/coat';
import { wallWords } from '@/lib/home/wall-words';
import { dollarWords } from '@/lib/money';
import { chooseGrouping } from './choose-grouping';
import { filmJobs } from './film-jobs';
import { knownWall } from './films';
import { type Grouping } from './grouping';
import { type Joined, joinToVisits } from './join-visits';
import { joinSource, visitDaySource } from './trip-rules';
import { type CareHome, type CareWall, type WallPlan, type Window, type WorkItem } from './types';
import { withRestain } from './with-restain';
import { yearlyWork } from './yearly-work';

const filmWords = { restain: 'coat', recaulk: 'caulk' } as const;

const lifeWords = (months: number) => (Math.round(months) === 0 ? 'less than a month' : monthsInWords(Math.round(months)));

/** Work in the window of the trip that it joins; it is planned anew once that has passed. */
function moved(item: WorkItem, window: Window): WorkItem {
  const value = exactRange(window.opensOn, window.closesOn);
  return { ...item, window, lapsesOn: addDays(window.closesOn, 1), explanation: { ...item.explanation, value, formula: `${item.explanation.formula}; then the window of the trip that it joins` } };
}

function joinedItem(item: WorkItem, { job, window, wallIds, months, cents, savesTrip }: Joined, home: CareHome): WorkItem {
  const film = filmWords[job.kind];
  const others = home.walls.filter(({ id }) => id !== job.wallId && wallIds.includes(id));
  const company = others.length > 0 ? wallWords(others, Number.POSITIVE_INFINITY) : 'other work on this wall';
  const trip = dollarWords(home.costs.tripCents);
  const gain = savesTrip ? `and saves a trip of about ${trip}` : `less than another trip of about ${trip}`;
  const { explanation, ...rest } = moved(item, window);
  return {
    ...rest,
    basis: 'joined to a visit',
    because: `Done in one trip with ${company}: it throws away ${lifeWords(months)} of this ${film}, about ${dollarWords(cents)}, ${gain}; on its own it would last until ${aboutDay(job.usedUpOn)}.`,
    explanation: {
      ...explanation,
      inputs: [
        ...explanation.inputs,
        { label: 'Window on its own', value: exactRange(item.window.opensOn, item.window.closesOn) },
        { label: 'Joins the trip for', value: company },
        { label: `Life of this ${film} thrown away`, value: `${lifeWords(months)} of ${monthsInWords(job.lifeMonths)}, about ${dollarWords(cents)}` },
        { label: 'A trip at this home’s prices', value: trip },
      ],
      sources: [...explanation.sources, joinSource, visitDaySource],
    },
  };
}

function caulkAlong(item: WorkItem, { window }: Joined): WorkItem {
  const along = moved(item, window);
  return { ...along, because: `${item.because} That restain shares an earlier trip.` };
}

/** A wall's plan with its joined work; the wash of the year goes with the restain anew. */
function withJoined(home: CareHome, wall: CareWall, plan: WallPlan, joined: readonly Joined[], today: CalendarDay): WallPlan {
  const restain = joined.find(({ job }) => job.kind === 'restain');
  const recaulk = joined.find(({ job }) => job.kind === 'recaulk');
  const items = plan.items.map((item) => {
    if (item.kind === 'restain' && restain) return joinedItem(item, restain, home);
    if (item.kind !== 'recaulk') return item;
    return recaulk ? joinedItem(item, recaulk, home) : restain?.caulk ? caulkAlong(item, restain) : item;
  });
  const moved = restain && items.find(({ kind }) => kind === 'restain');
  return { ...plan, items: moved ? items.map((item) => (item.kind === 'wash' ? (withRestain(yearlyWork(home, knownWall(home, wall), 'wash', today), moved) ?? item) : item)) : items };
}

/**
 * The plans of a home's walls with their work gathered into trips as it costs least, and the choices that were weighed. Like the
 * plans that come in, the same on every day until the next `lapsesOn`.
 */
export function groupedPlan(home: CareHome, walls: readonly WallPlan[], today: CalendarDay): { walls: WallPlan[]; grouping: Grouping } {
  const jobs = filmJobs(home, walls);
  const grouping = chooseGrouping(jobs, home.costs.tripCents);
  const joined = joinToVisits(jobs, { joinMonths: grouping.months, tripCents: home.costs.tripCents, today });
  const plans = walls.map((plan) => {
    const ofWall = joined.filter(({ job }) => job.wallId === plan.wallId);
    const wall = home.walls.find(({ id }) => id === plan.wallId);
    return wall && ofWall.length > 0 ? withJoined(home, wall, plan, ofWall, today) : plan;
  });
  return { walls: plans, grouping };
}
