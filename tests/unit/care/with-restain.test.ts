import { describe, expect, it } from 'vitest';
import { planHome } from '@/lib/care';
import { exampleCosts } from '@/lib/care/costs';
import { type CareHome } from '@/lib/care/types';
import { careHome, careRecord } from '@/tests/fixtures/care-home';

// The fixture's wall: coat 66 months, caulk 90 months, season May to September.
const today = '2026-03-20';
const spells = (home: CareHome) =>
  Object.fromEntries((planHome(home, today).walls[0]?.items ?? []).map((item) => [item.kind, [item.window.opensOn, item.window.closesOn, item.basis]]));
// A trip that costs nothing: work joins no other wall's or film's trip to save one.
const known = (restained: string, recaulked: string) => careHome({ costs: { ...exampleCosts.self, tripCents: 0 }, records: [careRecord('restain', restained), careRecord('recaulk', recaulked)] });

describe('caulk before stain', () => {
  it('pulls a recaulk due up to 18 months later forward into the restain', () => {
    // Restain due 10 June 2027; recaulk due 10 December 2028, 18 months later to the day.
    const home = known('2021-12-10', '2021-06-10');
    expect(spells(home)).toMatchObject({ restain: ['2027-05-01', '2027-08-09', 'computed'], recaulk: ['2027-05-01', '2027-08-09', 'pulled to the restain'] });
    const recaulk = planHome(home, today).walls[0]?.items.find(({ kind }) => kind === 'recaulk');
    expect(recaulk).toMatchObject({ dueOn: '2028-12-10' });
    expect(recaulk?.because).toBe('Caulk goes on before stain, so it is done with this wall’s restain and left to cure as its label says; on its own the caulk would last until early December 2028.');
    expect(recaulk?.explanation.value).toBe('May 1 – August 9, 2027');
  });

  it('leaves a recaulk alone that is due a day past that', () => {
    expect(spells(known('2021-12-10', '2021-06-11'))).toMatchObject({ recaulk: ['2028-05-01', '2028-09-30', 'computed'] });
  });

  it('lets an earlier recaulk wait for the restain only as long as caulk may be left', () => {
    // Recaulk due 10 April 2027: 60 days later is 9 June, within the restain's window from 1 May.
    expect(spells(known('2021-12-10', '2019-10-10'))).toMatchObject({ restain: ['2027-05-01', '2027-08-09', 'computed'], recaulk: ['2027-05-01', '2027-06-09', 'pulled to the restain'] });
    // Recaulk due 10 July 2026, eleven months before: done in its own season.
    expect(spells(known('2021-12-10', '2019-01-10'))).toMatchObject({ recaulk: ['2026-05-01', '2026-09-08', 'computed'] });
  });

  it('counts a recaulk as missed only when the shared window has passed', () => {
    // Without a season, caulk due 10 April 2027 would on its own be done by 10 May. The restain, missed on 9 January 2021, is
    // offered in spans of 90 days from the day after; the 26th runs from 10 March to 7 June 2027.
    const none = { seasons: [] };
    const home = { ...known('2015-06-10', '2019-10-10'), seasons: { oil: none, waterborne: none } };
    const recaulk = (on: string) => planHome(home, on).walls[0]?.items.find(({ kind }) => kind === 'recaulk');
    expect(recaulk('2027-05-20')).toMatchObject({ missedOn: null, basis: 'pulled to the restain', window: { closesOn: '2027-06-07' }, lapsesOn: '2027-06-08' });
  });

  it('leaves the owner’s own rule for caulk where it is', () => {
    const ownRules = [{ wallId: 'w1', kind: 'recaulk' as const, rule: 'FREQ=YEARLY;BYMONTH=8;BYMONTHDAY=1', startOn: '2028-01-01' }];
    expect(spells({ ...known('2021-12-10', '2021-06-10'), ownRules })).toMatchObject({ recaulk: ['2028-05-01', '2028-09-30', 'own rule'] });
  });

  it('puts look, wash, caulk and stain in working order', () => {
    expect(planHome(known('2021-01-10', '2021-06-10'), today).walls[0]?.items.map(({ kind }) => kind)).toEqual(['walkaround', 'wash', 'recaulk', 'restain']);
  });
});
