import { exactDay } from '@/lib/calendar-words';
import { type Budget, type BudgetYear } from '@/lib/care/budget';
import { judgedYears } from '@/lib/care/choose-grouping';
import { type WorkCosts } from '@/lib/care/costs';
import { type Grouping } from '@/lib/care/grouping';
import { stripSource } from '@/lib/care/stripping';
import { joinSource, visitDaySource } from '@/lib/care/trip-rules';
import { type ExplainedInput, type Explanation, type Source } from '@/lib/explain';
import { dollarWords } from '@/lib/money';
import { ourRule } from '@/lib/our-rules';
import { keysOf, type UnitSystem } from '@/lib/schemas/vocabulary';
import { costsForm, perWords, priceFields } from '@/lib/schemas/costs';

type Parts = Pick<BudgetYear, 'tripCents' | 'restainCents' | 'stripCents' | 'recaulkCents' | 'washCents'>;

const priceSource = ourRule('prices');
const yearSource = ourRule('wash in the budget');
const worthSource = ourRule('worth left');
const workSources: Source[] = [priceSource, yearSource, visitDaySource, joinSource, stripSource];

const labels: Record<keyof Parts, string> = { tripCents: 'Trips', restainCents: 'Restain', stripCents: 'Stripping first', recaulkCents: 'Recaulk', washCents: 'Wash' };
const partInputs = (parts: Parts): ExplainedInput[] => keysOf(labels).flatMap((part) => (parts[part] > 0 ? [{ label: labels[part], value: dollarWords(parts[part]) }] : []));
const formula = 'trips + restain + stripping + recaulk + wash';

/** The home's prices in the reader's units: 'Restain: wash and one maintenance coat', '$0.511 per ft²'. */
export const priceInputs = (costs: WorkCosts, units: UnitSystem): ExplainedInput[] => {
  const shown = costsForm(costs, units);
  return keysOf(priceFields).map((field) => ({ label: priceFields[field].label, value: `$${shown[field]} ${perWords(field, units)}`.trim() }));
};

export const yearExplained = (year: BudgetYear): Explanation => ({ figure: `Cost in ${year.year}`, value: dollarWords(year.cents), formula, inputs: partInputs(year), sources: workSources });

const totals = ({ years }: Budget): Parts => {
  const of = (part: keyof Parts) => years.reduce((sum, year) => sum + year[part], 0);
  return { tripCents: of('tripCents'), restainCents: of('restainCents'), stripCents: of('stripCents'), recaulkCents: of('recaulkCents'), washCents: of('washCents') };
};

const spanWords = ({ from, through }: Budget) => `${exactDay(from)} to ${exactDay(through)}`;

export const totalExplained = (plan: Budget, costs: WorkCosts, units: UnitSystem): Explanation => ({
  figure: `Cost through ${plan.through.slice(0, 4)}`,
  value: dollarWords(plan.cents),
  formula: `${formula}, of all years`,
  inputs: [{ label: 'Years', value: spanWords(plan) }, ...partInputs(totals(plan)), ...priceInputs(costs, units)],
  sources: workSources,
});

export const meanExplained = (plan: Budget): Explanation => ({
  figure: 'Mean cost a year',
  value: dollarWords(plan.yearlyCents),
  formula: 'the cost of all years ÷ the years from today to the end',
  inputs: [{ label: 'Cost of all years', value: dollarWords(plan.cents) }, { label: 'Years', value: spanWords(plan) }],
  sources: workSources,
});

/** What a choice of grouping costs a year. */
export const choiceExplained = ({ months, yearlyCents, trips }: Grouping['choices'][number], costs: WorkCosts, units: UnitSystem): Explanation => ({
  figure: months === 0 ? 'Cost a year, no trip shared early' : `Cost a year, walls due within ${months} months sharing a trip`,
  value: dollarWords(yearlyCents),
  formula: `(all trips of ${judgedYears} years with their restain, stripping and recaulk − what the coats and caulk are worth at the end) ÷ ${judgedYears}`,
  inputs: [{ label: `Trips in ${judgedYears} years`, value: String(trips) }, ...priceInputs(costs, units).filter(({ label }) => label !== priceFields.wash.label)],
  sources: [joinSource, worthSource, visitDaySource, stripSource, priceSource],
});
