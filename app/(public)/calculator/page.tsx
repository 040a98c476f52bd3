import { type Metadata } from 'next';
import { currentActor } from '@/app/_server/actor';
import { StainCalculator } from '@/components/takeoff/stain-calculator';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { unitsOf } from '@/db/queries/units';
import { readCalculator } from '@/lib/schemas/calculator';
import { estimateSchema } from '@/lib/schemas/estimate';
import { readForm } from '@/lib/schemas/form-values';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { stainAnswer } from '@/lib/takeoff/estimate';

export const metadata: Metadata = { title: 'Stain calculator', description: 'How much stain a log-look wall takes, and the cheapest cans to buy.' };

type Props = { searchParams: Promise<Record<string, string | string[] | undefined>> };

const example = (units: UnitSystem) => ({ units, walls: { 0: units === 'us' ? { width: '30', height: '9', openings: '36' } : { width: '9', height: '2.7', openings: '3.3' } } });

function asForm(query: Record<string, string | string[] | undefined>): FormData {
  const form = new FormData();
  for (const [name, value] of Object.entries(query)) for (const one of [value].flat()) if (one !== undefined) form.append(name, one);
  return form;
}

export default async function CalculatorPage({ searchParams }: Props) {
  const actor = await currentActor();
  const asked = readForm(asForm(await searchParams));
  const units: UnitSystem = asked.units === 'metric' || asked.units === 'us' ? asked.units : actor ? unitsOf(actor) : 'us';
  const start = asked.walls ? { ...asked, units } : example(units);
  const read = readCalculator(start);
  const parsed = 'body' in read ? estimateSchema.safeParse(read.body) : undefined;
  const other = units === 'us' ? 'metric' : 'us';
  return (
    <>
      <PageHead title="Stain calculator" lead="The size of your walls in; what to buy out. Nothing is kept." actions={<LinkButton look="quiet" href={`/calculator?units=${other}`}>{other === 'us' ? 'In feet and gallons' : 'In metres and litres'}</LinkButton>} />
      <Course as="div">
        <StainCalculator key={units} units={units} start={start} first={parsed?.success ? stainAnswer(parsed.data) : undefined} />
      </Course>
    </>
  );
}
