import { type CalendarDay } from '@/lib/calendar';
import { readSimple, simpleRule, tidyRule } from '@/lib/care/own-rule';
import { yearlyRule } from '@/lib/care/rule-build';
import { type OwnRule, type WorkItem } from '@/lib/care/types';
import { type RuleUnit, type RuleWay } from '@/lib/schemas/rule-ways';
import { type WorkKind } from '@/lib/schemas/vocabulary';

/** What the form of an own rule begins with. */
export type RuleStart = { how: RuleWay; every: string; unit: RuleUnit; months: string[]; rule: string; startOn: CalendarDay };

/** Where nothing is computed, the form begins with these; only a beginning, the owner answers. */
const usual: Record<WorkKind, string> = {
  restain: simpleRule({ every: 5, unit: 'years', months: [6] }),
  recaulk: simpleRule({ every: 5, unit: 'years', months: [6] }),
  wash: yearlyRule([4]),
  walkaround: yearlyRule([4, 10]),
};

/** The form begins with the owner's rule, else with the computed one. */
export function ruleStart(kind: WorkKind, own: OwnRule | undefined, computed: WorkItem | undefined, today: CalendarDay): RuleStart {
  const { rule, startOn } = own ?? { rule: computed?.rule ?? usual[kind], startOn: computed?.startOn ?? today };
  const simple = readSimple(rule);
  const { every, unit, months } = simple ?? readSimple(usual[kind]) ?? { every: 1, unit: 'years', months: [] };
  return { how: simple ? 'simple' : 'written', every: String(every), unit, months: months.map(String), rule: tidyRule(rule), startOn };
}
