import { type Metadata } from 'next';
import { pageData, pageHome } from '@/app/_server/page-data';
import { whatWasSaid } from '@/app/_server/said';
import { CostsForm } from '@/components/budget/costs-form';
import { SharingTable } from '@/components/budget/sharing-table';
import { YearsTable } from '@/components/budget/years-table';
import { YearsAheadChart } from '@/components/charts/years-ahead-chart';
import { Said } from '@/components/home/said';
import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';
import { Figure } from '@/components/ui/figure';
import { PageHead } from '@/components/ui/page-head';
import { PrintButton } from '@/components/ui/print-button';
import { unitsOf } from '@/db/queries/units';
import { homeYearsAhead } from '@/db/queries/years-ahead';
import { exampleCosts } from '@/lib/care/costs';
import { choiceExplained, meanExplained, totalExplained, yearExplained } from '@/lib/home/budget-explained';
import { missingWords, sharingWords, yearWords } from '@/lib/home/budget-words';
import { can } from '@/lib/permissions';
import { costsForm } from '@/lib/schemas/costs';
import { saveCosts } from './actions';

export const metadata: Metadata = { title: 'Years ahead' };

type Props = { params: Promise<{ homeId: string }> };

export default async function YearsAheadPage({ params }: Props) {
  const { actor, view } = await pageHome((await params).homeId);
  const { id: homeId, name } = view.home;
  const { home, grouping, budget, pricesSetAt } = pageData(() => homeYearsAhead(actor, homeId, new Date()));
  const units = unitsOf(actor);
  const { costs, walls } = home;
  const start = costsForm(costs, units);
  const examples = { self: costsForm(exampleCosts.self, units), hired: costsForm(exampleCosts.hired, units) };
  const missing = missingWords(budget, walls);
  return (
    <main id="main">
      <PageHead title="Years ahead" lead="What the walls will need and cost, year by year, and which walls share a trip." path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${homeId}`, label: name }, { href: `/homes/${homeId}/plan`, label: 'Plan' }]} actions={<PrintButton>Print the years</PrintButton>} />
      <Said words={await whatWasSaid()} />
      {walls.length === 0 ? (
        <Course as="div">
          <EmptyState title="No walls yet" action={{ href: `/homes/${homeId}/walls/new`, label: 'Add a wall' }}>
            <p>What the years cost follows from the size of the walls and the days of their coats.</p>
          </EmptyState>
        </Course>
      ) : (
        <Course heading="Fifteen years" aside={pricesSetAt ? 'At the prices of this home, further down.' : 'At example prices that we made up: put in yours further down.'}>
          <div className="mb-4 grid gap-x-10 sm:grid-cols-2">
            <Figure size="large" explanation={meanExplained(budget)} />
            <Figure size="large" explanation={totalExplained(budget, costs, units)} />
          </div>
          {missing ? <p className="mb-4">{missing} Log when it was last done, or look at it on a walkaround.</p> : null}
          <YearsAheadChart years={budget.years} />
          <YearsTable caption="What is done in each year, and what it costs" years={budget.years.map((year) => ({ year: year.year, words: yearWords(year, walls), explanation: yearExplained(year) }))} />
        </Course>
      )}
      <Course heading="Which walls share a trip" aside="The choice that costs least a year.">
        {grouping.choices.length === 0 ? (
          <p>There is nothing to choose yet: no wall has a day from which its coat or caulk could be counted.</p>
        ) : (
          <>
            <p className="mb-4 text-lg font-semibold">{sharingWords(grouping.months)}</p>
            <SharingTable grouping={grouping} explanations={grouping.choices.map((choice) => choiceExplained(choice, costs, units))} />
          </>
        )}
      </Course>
      <Course heading="What work costs here" className="no-print" aside={pricesSetAt ? 'As said for this home.' : 'These are example prices that we made up: put in what you pay.'}>
        {can(actor, 'home.edit', { membership: view.membership }) ? <CostsForm action={saveCosts} homeId={homeId} units={units} start={start} byDoer={{ ...examples, [costs.doer]: start }} /> : <p>Only an owner or co-owner changes the prices.</p>}
      </Course>
    </main>
  );
}
