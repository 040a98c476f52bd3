import { type Metadata } from 'next';
import { requireActor } from '@/app/_server/actor';
import { pageData } from '@/app/_server/page-data';
import { whatWasSaid } from '@/app/_server/said';
import { Said } from '@/components/home/said';
import { HomeJobsCourse } from '@/components/jobs/home-jobs';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';
import { Measure } from '@/components/ui/measure';
import { PageHead } from '@/components/ui/page-head';
import { upcomingJobs } from '@/db/queries/job-list';
import { unitsOf } from '@/db/queries/units';
import { aboutRange, exactRange } from '@/lib/calendar-words';
import { seasonsOf } from '@/lib/jobs/seasons';

export const metadata: Metadata = { title: 'Work ahead' };

type Props = { searchParams: Promise<{ kind?: string }> };

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

export default async function WorkPage({ searchParams }: Props) {
  const actor = await requireActor(['contractor']);
  const { kind } = await searchParams;
  const { jobs, owners } = pageData(() => upcomingJobs(actor));
  const shown = kind === 'restain' || kind === 'recaulk' ? jobs.filter(({ item }) => item.kind === kind) : jobs;
  const seasons = seasonsOf(shown, new Date());
  const units = unitsOf(actor);
  const filters = [{ href: '/work', label: 'All' }, { href: '/work?kind=restain', label: 'Restains' }, { href: '/work?kind=recaulk', label: 'Recaulks' }];
  return (
    <main id="main">
      <PageHead title="Work ahead" lead="Of the homes that owners share with you, season by season." />
      <Said words={await whatWasSaid()} />
      {jobs.length === 0 ? (
        <Course as="div">
          <EmptyState title="No home is shared with you yet">
            <p>An owner opens their home, chooses Share, and types your address: <strong>{actor.email}</strong>. Then its coming restains and recaulks stand here, with areas and gallons.</p>
          </EmptyState>
        </Course>
      ) : (
        <nav aria-label="Kind of work" className="within no-print -mt-3 flex flex-wrap pb-3">
          {filters.map((filter) => <LinkButton key={filter.href} href={filter.href} look="plain">{filter.label}</LinkButton>)}
        </nav>
      )}
      {jobs.length > 0 && shown.length === 0 ? <Course as="div"><p>Nothing of this kind is coming up.</p></Course> : null}
      {seasons.map((season) => (
        <section key={season.year} aria-labelledby={`season-${season.year}`}>
          <Course as="div" tone="quiet">
            <h2 id={`season-${season.year}`} title={exactRange(season.opensOn, season.closesOn)}>{capital(aboutRange(season.opensOn, season.closesOn))}</h2>
            <p className="mt-1 text-lg">
              {season.homes.length === 1 ? '1 home' : `${season.homes.length} homes`}
              {season.stainM2 > 0 ? <>, <Measure kind="area" value={season.stainM2} units={units} /> to stain, about <Measure kind="volume" value={season.buyL} units={units} /> of stain</> : ', caulk only'}
              {season.overdue > 0 ? `; ${season.overdue} overdue` : ''}.
            </p>
          </Course>
          {season.homes.map((home) => <HomeJobsCourse key={home.home.id} jobs={home} owner={owners.get(home.home.id)} units={units} />)}
        </section>
      ))}
    </main>
  );
}
