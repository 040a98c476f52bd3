import { describe, expect, it } from 'vitest';
import { planChange } from '@/lib/home/plan-change';
import { workItem as item } from '@/tests/fixtures/work-item';

const walls = [{ id: 'f', name: 'Front' }, { id: 'b', name: 'Back' }];

describe('what a change did to a plan', () => {
  it('names wall, work and both months, in plan order', () => {
    const before = [item('b', 'restain', '2028-06-01'), item('f', 'restain', '2027-05-01')];
    const after = [item('f', 'restain', '2032-08-01'), item('b', 'restain', '2029-06-01')];
    expect(planChange(before, after, walls)).toEqual(['Front: next restain moves from May 2027 to August 2032.', 'Back: next restain moves from June 2028 to June 2029.']);
  });

  it('tells early from late inside one month, and is silent about less', () => {
    expect(planChange([item('f', 'wash', '2027-05-02')], [item('f', 'wash', '2027-05-28')], walls)).toEqual(['Front: next wash moves from early May 2027 to late May 2027.']);
    expect(planChange([item('f', 'wash', '2027-05-02')], [item('f', 'wash', '2027-05-09')], walls)).toEqual([]);
  });

  it('says once what moved alike', () => {
    const all = (day: string) => walls.map(({ id }) => item(id, 'restain', day));
    expect(planChange(all('2027-05-01'), all('2029-05-01'), walls)).toEqual(['Both walls: next restain moves from May 2027 to May 2029.']);
  });

  it('says what is new and what is gone', () => {
    expect(planChange([], [item('f', 'recaulk', '2027-05-15')], walls)).toEqual(['Front: next recaulk in mid-May 2027.']);
    expect(planChange([item('b', 'restain', '2027-05-15')], [], walls)).toEqual(['Back: no restain is planned any more.']);
  });
});
