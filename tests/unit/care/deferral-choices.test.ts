import { describe, expect, it } from 'vitest';
import { planHome } from '@/lib/care';
import { deferralChoices, waitWords } from '@/lib/care/deferral-choices';
import { type CareHome } from '@/lib/care/types';
import { careHome, careRecord } from '@/tests/fixtures/care-home';

const today = '2026-03-20';
const choice = (home: CareHome, kind: 'restain' | 'wash' | 'recaulk', on = today) => {
  const items = planHome(home, on).walls.flatMap((wall) => wall.items).filter((item) => item.kind === kind);
  const [one] = deferralChoices(home, items, on);
  if (!one) throw new Error('nothing to put off');
  return one;
};

// The fixture's wall: coat life 66 months, season May to September, 25.08 m², stripping $14 a m².
describe('the price of waiting', () => {
  it('is the share of the coat that is left when the later season opens, and the months without one', () => {
    // Used up on 10 December 2026; from then to 1 May 2027 are 142 days, 4.66 of 66 months: −7 %.
    const one = choice(careHome({ records: [careRecord('restain', '2021-06-10')] }), 'restain');
    expect(one).toMatchObject({ notBefore: '2027-05-01', after: { window: { opensOn: '2027-05-01', closesOn: '2027-09-30' } }, price: { monthsBare: 5, stripCents: 0, stripsAnyway: false } });
    expect(one.price?.leftThen).toBeCloseTo(-142 / 30.44 / 66, 6);
    expect(one.price?.explanation.value).toBe('−7 %');
    expect(waitWords(one)).toBe('Moves from May 1 – September 30, 2026 to May 1 – September 30, 2027. By then the wall has stood 5 months past the end of its coat.');
  });

  it('is stripping, at the home’s price, for a coat that waiting makes too old', () => {
    // A water repellent of 24 months (1–3 years, severity 0.5) of 10 June 2024, used up on 10 June 2026; on 1 May 2027 it is 10.7 months past: more than 0.15 of 24.
    const home = careHome({ records: [careRecord('restain', '2024-06-10', { finish: 'water-repellent' })] });
    expect(choice(home, 'restain').price).toMatchObject({ stripCents: Math.round(25.08 * 1400), stripsAnyway: false });
    // A year on it is too old in any case: waiting does not add to that.
    const late = choice(home, 'restain', '2026-12-01');
    expect(late.price).toMatchObject({ stripCents: 0, stripsAnyway: true });
    expect(waitWords(late)).toMatch(/stripped first in any case\.$/);
  });

  it('is nothing while the film lasts', () => {
    const one = choice(careHome({ records: [careRecord('recaulk', '2020-01-12')] }), 'recaulk');
    // Caulk of 90 months, used up on 12 July 2027, window May to 10 September 2027; the next opens in May 2028.
    expect(one.price?.monthsBare).toBe(10);
    expect(waitWords(choice(careHome(), 'wash'))).toMatch(/^Moves from .* 2026 to .* 2027\.$/);
  });
});
