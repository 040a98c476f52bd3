import { type ReactNode } from 'react';
import { When } from '@/components/plan/when';
import { LinkButton } from '@/components/ui/button';
import { Course, type Tone } from '@/components/ui/course';
import { StateMark } from '@/components/ui/state-mark';
import { type CalendarDay } from '@/lib/calendar';
import { type WorkState } from '@/lib/care/types';
import { missedSince, type WorkGroup, workWords } from '@/lib/home/next-work';

const tones: Record<WorkState, Tone> = { overdue: 'ember', due: 'honey', 'due soon': 'honey', later: 'plain' };

type NextCourseProps = {
  homeId: string;
  /** The most pressing work and what falls into the same window with it. */
  groups: readonly WorkGroup[];
  wallCount: number;
  today: CalendarDay;
  mayLog: boolean;
  /** Of the wall that presses most. */
  why?: { wall: string; because: string } | undefined;
  /** Its figures. */
  children: ReactNode;
};

/** What is next and why, in one sentence. */
export function NextCourse({ homeId, groups, wallCount, today, mayLog, why, children }: NextCourseProps) {
  const [first] = groups;
  if (!first) return null;
  const query = new URLSearchParams([['kind', first.kind], ...first.walls.map(({ id }) => ['wall', id])]);
  return (
    <Course heading="Next" tone={tones[first.state]} aside={<StateMark state={first.state} />}>
      <p className="figures max-w-4xl text-2xl md:text-3xl">{workWords(groups, wallCount)}</p>
      <p className="mt-1 text-xl">
        <When spell={{ ...first, missedOn: missedSince(groups) }} today={today} capital />
      </p>
      {why ? (
        <p className="mt-3 max-w-prose">
          <strong>{why.wall}:</strong> {why.because}
        </p>
      ) : null}
      <div className="mt-3 grid max-w-4xl gap-x-10 gap-y-2 sm:grid-cols-3 sm:[&>details[open]]:col-span-full">{children}</div>
      <div className="no-print mt-5 flex flex-wrap gap-3">
        {mayLog ? <LinkButton href={`/homes/${homeId}/log?${query}`}>Log it</LinkButton> : null}
        <LinkButton href={`/homes/${homeId}/buy`} look="quiet">
          What to buy
        </LinkButton>
        <LinkButton href={`/homes/${homeId}/plan`} look="quiet">
          The whole plan
        </LinkButton>
      </div>
    </Course>
  );
}
