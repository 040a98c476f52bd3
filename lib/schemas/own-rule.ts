import { z } from 'zod';
import { isCalendarDay } from '@/lib/calendar';
import { checkRule } from '@/lib/care';
import { simpleRule, tidyRule } from '@/lib/care/own-rule';
import { choice, neededText } from '@/lib/schemas/measures';
import { ruleUnits, type RuleWay, ruleWays } from '@/lib/schemas/rule-ways';
import { keysOf, workKinds } from '@/lib/schemas/vocabulary';

/** At most so many between two times. Our rule: no coat or caulk lasts longer. */
const most = { years: 30, months: 360 } as const;

/** One rule is about one kind of work on one wall. */
export const ruleTarget = z.object({ homeId: neededText('The home', 60), wallId: neededText('The wall', 60), kind: choice(keysOf(workKinds), 'the kind of work') });

const optionalText = z.string().trim().optional().transform((text) => text ?? '');
const typed = ruleTarget.extend({ how: choice(keysOf(ruleWays), 'how to say the rule'), every: optionalText, unit: optionalText, months: z.array(z.string()).max(12).optional(), rule: optionalText, startOn: optionalText });

type Typed = z.output<typeof typed>;
type Fault = (field: keyof Typed, message: string) => void;

function simpleText({ every, unit, months = [] }: Typed, fault: Fault): string {
  const known = keysOf(ruleUnits).find((one) => one === unit);
  if (!known) fault('unit', 'Choose years or months.');
  const count = /^\d{1,3}$/.test(every) ? Number(every) : 0;
  const limit = most[known ?? 'years'];
  if (count < 1 || count > limit) fault('every', `Say a whole number from 1 to ${limit}.`);
  const named = months.map(Number);
  if (known === 'years' && named.some((month) => !Number.isInteger(month) || month < 1 || month > 12)) fault('months', 'Choose months from the list.');
  return simpleRule({ every: count, unit: known ?? 'years', months: named });
}

function writtenText({ rule }: Typed, fault: Fault): string {
  const checked = checkRule(rule);
  if (checked.ok) return tidyRule(rule);
  fault('rule', checked.error);
  return '';
}

/** The form of an owner's own rule: out come the rule's text (RFC 5545) and its start. Every fault stands at its field. */
export const ownRuleSchema = typed.transform((form, ctx) => {
  const fault: Fault = (field, message) => ctx.addIssue({ code: 'custom', message, path: [field] });
  const rule = form.how === 'simple' ? simpleText(form, fault) : writtenText(form, fault);
  if (!isCalendarDay(form.startOn)) fault('startOn', 'Say from which day the rule counts, like 2026-06-15.');
  const { homeId, wallId, kind, how, startOn } = form;
  return { homeId, wallId, kind, how, rule, startOn };
});

/** The field of the form that a fault of the rule as a whole belongs to. */
export const faultField = (how: RuleWay, about: 'rule' | 'startOn'): string => (about === 'startOn' ? 'startOn' : how === 'simple' ? 'every' : 'rule');
