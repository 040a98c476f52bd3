import { describe, expect, it } from 'vitest';
import { faultField, ownRuleSchema } from '@/lib/schemas/own-rule';

const form = { homeId: 'h', wallId: 'w', kind: 'restain', how: 'simple', every: '3', unit: 'years', months: ['9', '5'], rule: '', startOn: '2026-06-15' };
const faults = (values: object) => {
  const parsed = ownRuleSchema.safeParse({ ...form, ...values });
  return parsed.success ? null : parsed.error.issues.map(({ path }) => path.join('.')).sort();
};
const messages = (values: object) => ownRuleSchema.safeParse({ ...form, ...values }).error?.issues.map(({ message }) => message) ?? [];

describe('the form of an own rule', () => {
  it('makes a rule of simple answers', () => {
    expect(ownRuleSchema.parse(form)).toEqual({ homeId: 'h', wallId: 'w', kind: 'restain', how: 'simple', rule: 'FREQ=YEARLY;INTERVAL=3;BYMONTH=5,9;BYMONTHDAY=15', startOn: '2026-06-15' });
    expect(ownRuleSchema.parse({ ...form, unit: 'months', every: '62' }).rule).toBe('FREQ=MONTHLY;INTERVAL=62');
    expect(ownRuleSchema.parse({ ...form, months: undefined }).rule).toBe('FREQ=YEARLY;INTERVAL=3');
  });

  it('keeps a written rule, tidied, and what was answered the other way does not matter', () => {
    expect(ownRuleSchema.parse({ ...form, how: 'written', rule: ' rrule:freq=yearly;bymonth=5;byday=1mo ', every: 'x', unit: 'weeks' }).rule).toBe('FREQ=YEARLY;BYMONTH=5;BYDAY=1MO');
    expect(faults({ rule: 'nonsense' })).toBeNull();
  });

  it.each([
    [{ every: '' }, ['every']],
    [{ every: '0' }, ['every']],
    [{ every: '2.5' }, ['every']],
    [{ every: '31' }, ['every']],
    [{ every: '360', unit: 'months' }, null],
    [{ every: '361', unit: 'months' }, ['every']],
    [{ unit: 'weeks' }, ['unit']],
    [{ months: ['13'] }, ['months']],
    [{ months: ['May'] }, ['months']],
    [{ startOn: '2027-02-29' }, ['startOn']],
    [{ startOn: undefined }, ['startOn']],
    [{ how: 'written' }, ['rule']],
    [{ how: 'written', rule: 'FREQ=FORTNIGHTLY', startOn: 'soon' }, ['rule', 'startOn']],
    [{ every: 'x', unit: '', months: ['0'], startOn: '' }, ['every', 'startOn', 'unit']],
    [{ kind: 'paint' }, ['kind']],
    [{ how: 'drawn' }, ['how']],
  ])('%o is a fault of %o', (values, fields) => expect(faults(values)).toEqual(fields));

  it('says what is wrong with a written rule', () => expect(messages({ how: 'written', rule: 'FREQ=YEARLY;BYMONTH=13' })).toEqual(['BYMONTH=13: whole numbers from 1 to 12 are allowed.']));

  it('puts a fault of the rule where it was said', () => {
    expect([faultField('simple', 'rule'), faultField('written', 'rule'), faultField('simple', 'startOn')]).toEqual(['every', 'rule', 'startOn']);
  });
});
