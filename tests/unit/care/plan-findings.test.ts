import { describe, expect, it } from 'vitest';
import { planHome } from '@/lib/care';
import { nextChance } from '@/lib/care/put-off';
import { learnedWords } from '@/lib/care/learned-words';
import { type CareFinding, type CareHome } from '@/lib/care/types';
import { workKey } from '@/lib/care/work-key';
import { type WorkKind } from '@/lib/schemas/vocabulary';
import { careHome, careRecord } from '@/tests/fixtures/care-home';

// The fixture's wall: coat life 66 months, coating season May to September.
const found = (on: string, coat: CareFinding['coat'], seal: CareFinding['seal'] = null, recordId = `f${on}`): CareFinding => ({ wallId: 'w1', recordId, on, coat, seal });
const planOf = (home: CareHome, today: string) => planHome(home, today).walls[0];
const itemOf = (home: CareHome, kind: WorkKind, today: string) => planOf(home, today)?.items.find((item) => item.kind === kind);
const coated = (findings: CareFinding[]) => careHome({ records: [careRecord('restain', '2023-06-10')], findings });

describe('a coat that was looked at', () => {
  it('is due from the day on which it was found due, and shortens the wall’s life', () => {
    // Found due on 10 June 2026: 1096 days, 3.0007 years of 5.5; k = exp(0.7353 × ln 0.5456) = 0.6405; 66 × 0.6405 = 42.3 months.
    const home = coated([found('2026-06-10', 'due')]);
    expect(planOf(home, '2026-06-11')?.coat).toMatchObject({ lifeMonths: 42, factor: expect.closeTo(0.6405, 3), found: { state: 'due', on: '2026-06-10' }, assumed: false });
    expect(itemOf(home, 'restain', '2026-06-11')).toMatchObject({ dueOn: '2026-06-10', basis: 'found', missedOn: null, window: { opensOn: '2026-05-01', closesOn: '2026-08-09' } });
    expect(itemOf(home, 'restain', '2026-06-11')?.because).toBe('The coat of June 2023 was found due on June 10, 2026; it had been expected to last until early December 2026. This wall’s coat has worn 56 % faster than the model since 2023.');
  });

  it('waits for the coming season when it is found due after the season', () => {
    const home = coated([found('2026-10-20', 'due')]);
    expect(itemOf(home, 'restain', '2026-10-21')).toMatchObject({ dueOn: '2026-10-20', missedOn: null, window: { opensOn: '2027-05-01', closesOn: '2027-09-30' } });
  });

  it('is overdue at once when it was found past due', () => {
    const home = coated([found('2026-10-20', 'past due')]);
    expect(itemOf(home, 'restain', '2026-10-21')).toMatchObject({ missedOn: '2026-10-20', window: { opensOn: '2027-05-01' } });
    expect(itemOf(home, 'restain', '2027-10-01')).toMatchObject({ missedOn: '2026-10-20', window: { opensOn: '2028-05-01' } });
  });

  it('is left for half a year when it is sound beyond its time, and lengthens the wall’s life', () => {
    // On 10 June 2029 it is six years old: k = exp(½ ln(6.9 / 5.5)) = 1.12, 74 months, until 10 August 2029; half a year on is 10 December.
    const home = coated([found('2029-06-10', 'sound')]);
    expect(planOf(home, '2029-06-11')?.coat).toMatchObject({ lifeMonths: 74, factor: expect.closeTo(1.12, 2) });
    expect(itemOf(home, 'restain', '2029-06-11')).toMatchObject({ dueOn: '2029-12-10', basis: 'found' });
  });

  it('changes nothing when it is sound before its time', () => {
    const plain = itemOf(coated([]), 'restain', '2026-06-11');
    expect(itemOf(coated([found('2026-06-10', 'sound')]), 'restain', '2026-06-11')).toMatchObject({ dueOn: plain?.dueOn, window: plain?.window, because: plain?.because });
  });

  it('keeps what an earlier coat taught once it is renewed', () => {
    const home = careHome({ records: [careRecord('restain', '2021-06-10'), careRecord('restain', '2025-06-10')], findings: [found('2025-06-10', 'due')] });
    // Four years of 5.5: k = exp(0.7353 × ln 0.7273) = 0.7912; 52 months from 10 June 2025.
    expect(planOf(home, '2026-03-20')?.coat).toMatchObject({ lifeMonths: 52, found: null, startedOn: '2025-06-10' });
    const coat = planOf(home, '2026-03-20')?.coat;
    expect(coat && learnedWords(coat)).toBe('This wall’s coat has worn 26 % faster than the model since 2021.');
    expect(coat?.explanation.inputs.at(-1)).toEqual({ label: 'Coat of June 10, 2021: due on June 10, 2025, 4.0 years old; the model said 5.5 years', value: 'factor 1.00 → 0.79' });
  });

  it('never touches the caulk, nor the other way round', () => {
    const home = careHome({ records: [careRecord('restain', '2023-06-10'), careRecord('recaulk', '2023-06-10')], findings: [found('2026-06-10', 'due')] });
    expect(planOf(home, '2026-06-11')?.seal).toMatchObject({ factor: 1, found: null });
  });
});

describe('a coat of which nobody knows the day', () => {
  it('gets an assumed age from how it was found, and needs no first walkaround any more', () => {
    const home = careHome({ findings: [found('2026-05-01', 'sound', 'sound')] });
    const plan = planOf(home, '2026-05-02');
    // Half of 66 months before 1 May 2026; used up 33 months after it.
    expect(plan?.coat).toMatchObject({ startedOn: '2023-08-01', assumed: true, learned: [], factor: 1 });
    expect(itemOf(home, 'restain', '2026-05-02')).toMatchObject({ dueOn: '2029-02-01', because: expect.stringMatching(/^Nobody knows the day of this coat\. It was found sound on May 1, 2026, so it is taken to last until early February 2029 \(assumed\)\./) as string });
    expect(itemOf(home, 'walkaround', '2026-05-02')?.basis).toBe('computed');
  });

  it('still needs a walkaround when nobody looked', () => {
    expect(itemOf(careHome(), 'walkaround', '2026-05-02')?.basis).toBe('date not known');
  });
});

describe('work that was put off', () => {
  const home = careHome({ records: [careRecord('restain', '2021-06-10')] });
  const seasons = home.seasons.oil.seasons;
  const due = itemOf(home, 'restain', '2026-03-20');
  if (!due) throw new Error('the fixture has a restain');
  const deferred = { ...home, deferrals: [{ workKey: workKey(due), notBefore: '2027-05-01' }] };

  it('can wait for the season after its own', () => {
    expect(due.window).toMatchObject({ opensOn: '2026-05-01', closesOn: '2026-09-30' });
    expect(nextChance(due, seasons)).toEqual({ opensOn: '2027-05-01', closesOn: '2027-09-30', moved: 'put off' });
  });

  it('is asked for in that season, is not overdue before it, and is when that passes too', () => {
    for (const day of ['2026-03-20', '2026-10-15', '2027-05-02']) {
      expect(itemOf(deferred, 'restain', day)).toMatchObject({ dueOn: '2026-12-10', basis: 'put off', missedOn: null, window: { opensOn: '2027-05-01', closesOn: '2027-09-30' } });
    }
    expect(itemOf(deferred, 'restain', '2027-10-01')).toMatchObject({ missedOn: '2027-09-30', window: { opensOn: '2028-05-01' } });
  });

  it('starts anew once it is done', () => {
    const done = { ...deferred, records: [...home.records, careRecord('restain', '2026-08-01')] };
    expect(itemOf(done, 'restain', '2026-08-02')).toMatchObject({ basis: 'computed', dueOn: '2032-02-01' });
  });

  it('skips one turn of yearly work', () => {
    const wash = itemOf(home, 'wash', '2026-03-20');
    if (!wash) throw new Error('the fixture has a wash');
    const later = { ...home, deferrals: [{ workKey: workKey(wash), notBefore: '2026-12-01' }] };
    expect(itemOf(later, 'wash', '2026-03-20')?.dueOn.slice(0, 4)).toBe('2027');
  });

  it('waits half a year where there is no season', () => {
    expect(nextChance({ window: { opensOn: '2026-02-01', closesOn: '2026-05-01', moved: 'in season' } }, [{ fromMonth: 1, toMonth: 12 }])).toMatchObject({ opensOn: '2026-08-01' });
  });
});
