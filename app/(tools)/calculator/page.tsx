import { type Metadata } from 'next';
import { currentActor } from '@/app/_server/actor';
import { StainCalculator } from '@/components/takeoff/stain-calculator';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { unitsOf } from '@/db/queries/units';
import { calculatorStart, editCalculator, exampleWalls } from '@/lib/schemas/calculator-values';
import { queryForm, type QueryValues, readForm } from '@/lib/schemas/form-values';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { answerForm } from '@/lib/takeoff/form-answer';

export const metadata: Metadata = { title: 'Stain calculator', description: 'How much stain a log-look wall takes, and the cheapest containers to buy.' };

type Props = { searchParams: Promise<QueryValues> };

/** The form as it was sent without scripts, or an example in the reader's units. */
export default async function CalculatorPage({ searchParams }: Props) {
  const actor = await currentActor();
  const sent = readForm(queryForm(await searchParams));
  const units: UnitSystem = sent.units === 'metric' || sent.units === 'us' ? sent.units : actor ? unitsOf(actor) : 'us';
  const start = calculatorStart(sent.walls ? sent : { ...sent, walls: exampleWalls[units] }, units);
  const values = editCalculator(start, typeof sent.edit === 'string' ? sent.edit : '');
  return (
    <>
      <PageHead title="Stain calculator" lead="The size of your walls in; what to buy out. Nothing is kept." />
      <Course as="div">
        <StainCalculator start={values} first={answerForm(values)} />
      </Course>
    </>
  );
}
