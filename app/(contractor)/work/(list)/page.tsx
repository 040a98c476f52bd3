import { type Metadata } from 'next';
import { requireActor } from '@/app/_server/actor';
import { pageData } from '@/app/_server/page-data';
import { whatWasSaid } from '@/app/_server/said';
import { Said } from '@/components/home/said';
import { jobKind, KindFilter } from '@/components/jobs/kind-filter';
import { NoHomes } from '@/components/jobs/no-homes';
import { SeasonHead } from '@/components/jobs/season-head';
import { VisitCourse } from '@/components/jobs/visit-course';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { PrintButton } from '@/components/ui/print-button';
import { upcomingJobs } from '@/db/queries/job-list';
import { unitsOf } from '@/db/queries/units';
import { aboutRange, exactRange } from '@/lib/calendar-words';
import { capital } from '@/lib/home/wall-words';
import { type JobVisit, workAhead } from '@/lib/jobs/work-ahead';

export const metadata: Metadata = { title: 'Work ahead' };

type Props = { searchParams: Promise<{ kind?: string | string[] }> };

export default async function WorkPage({ searchParams }: Props) {
  const actor = await requireActor(['contractor']);
  const kind = jobKind((await searchParams).kind);
  const { jobs, owners } = pageData(() => upcomingJobs(actor));
  const units = unitsOf(actor);
  const shown = kind ? jobs.filter(({ item }) => item.kind === kind) : jobs;
  const { overdue, seasons } = workAhead(shown, new Date(), units);
  const courses = (visits: JobVisit[]) => visits.map((visit) => <VisitCourse key={`${visit.home.id} ${visit.opensOn}`} visit={visit} owner={owners.get(visit.home.id)} units={units} />);
  return (
    <main id="main">
      <PageHead title="Work ahead" lead="Of the homes that owners share with you, season by season." actions={jobs.length > 0 ? <PrintButton>Print</PrintButton> : null} />
      <Said words={await whatWasSaid()} />
      {jobs.length > 0 ? <KindFilter chosen={kind} /> : <Course as="div"><NoHomes email={actor.email} units={units} /></Course>}
      {jobs.length > 0 && shown.length === 0 ? <Course as="div"><p>No {kind} is coming up.</p></Course> : null}
      {overdue ? (
        <section aria-labelledby="overdue">
          <SeasonHead id="overdue" title="Overdue" totals={overdue.totals} units={units} tone="ember" />
          {courses(overdue.visits)}
        </section>
      ) : null}
      {seasons.map((season) => (
        <section key={season.year} aria-labelledby={`season-${season.year}`}>
          <SeasonHead id={`season-${season.year}`} title={<span title={exactRange(season.opensOn, season.closesOn)}>{capital(aboutRange(season.opensOn, season.closesOn))}</span>} totals={season.totals} withOverdue={season.withOverdue} units={units} />
          {courses(season.visits)}
        </section>
      ))}
    </main>
  );
}
