'use client';

import useSWR from 'swr';
import { readJson } from '@/components/home/read-json';
import { VisitCourse } from '@/components/plan/visit-course';
import { type PlanView } from '@/lib/home/plan-view';

type PlanCoursesProps = { initial: PlanView; mayLog: boolean; mayPutOff: boolean };

/** The plan in visits; it follows changes made in this tab or another one without a reload. */
export function PlanCourses({ initial, mayLog, mayPutOff }: PlanCoursesProps) {
  const { data } = useSWR<PlanView>(`/api/homes/${initial.homeId}/plan`, readJson, { fallbackData: initial, refreshInterval: 60_000 });
  const plan = data && data.revision >= initial.revision ? data : initial;
  return (
    <div>
      <p role="status" className="sr-only">
        {plan.revision === initial.revision ? '' : 'The plan has changed.'}
      </p>
      {plan.visits.map((visit) => (
        <VisitCourse key={`${visit.opensOn} ${visit.items[0]?.wallId} ${visit.items[0]?.kind}`} homeId={plan.homeId} visit={visit} today={plan.today} wallCount={plan.wallCount} mayLog={mayLog} mayPutOff={mayPutOff} />
      ))}
    </div>
  );
}
