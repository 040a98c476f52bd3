import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { decidingItem, missedSince, nextTogether, workGroups, workWords } from '@/lib/home/next-work';
import { keysOf, workKinds } from '@/lib/schemas/vocabulary';
import { workItem } from '@/tests/fixtures/work-item';

const walls = ['Front', 'Left side', 'Back', 'Right side'].map((name) => ({ id: name, name }));
const today = '2026-12-01';

describe('what is next on a home', () => {
  it('puts overdue work before work whose window is open, and both before later work', () => {
    const items = [workItem('Front', 'restain', '2026-12-01'), workItem('Back', 'wash', '2026-05-01'), workItem('Left side', 'restain', '2027-01-15'), workItem('Left side', 'wash', '2028-05-01')];
    expect(workGroups(items, walls, today).map(({ kind, state }) => [kind, state])).toEqual([['wash', 'overdue'], ['restain', 'due'], ['restain', 'due soon'], ['wash', 'later']]);
  });

  it('says in one sentence what one trip does, walls in plan order', () => {
    const season = '2027-06-01';
    const items = [
      workItem('Back', 'restain', season, { missedOn: '2024-08-31', dueOn: '2024-10-01' }),
      workItem('Front', 'restain', season, { missedOn: '2026-08-31', dueOn: '2026-10-01' }),
      workItem('Front', 'recaulk', season, { missedOn: '2025-08-31' }),
      workItem('Back', 'recaulk', season, { missedOn: '2025-08-31' }),
      workItem('Left side', 'wash', season),
    ];
    const next = nextTogether(workGroups(items, walls, today));
    expect(workWords(next, 4)).toBe('Recaulk and restain Front and Back');
    expect(missedSince(next)).toBe('2024-08-31');
    expect(decidingItem(next)).toMatchObject({ wallId: 'Back', kind: 'restain' });
  });

  it('names different walls apart, and all walls as such', () => {
    const next = workGroups([...walls.map(({ id }) => workItem(id, 'wash', '2027-05-01')), workItem('Front', 'restain', '2027-05-01')], walls, today);
    expect(workWords(nextTogether(next), 4)).toBe('Restain Front, wash all 4 walls');
  });

  it('keeps every item exactly once, whatever the plan', () => {
    const day = fc.integer({ min: 1, max: 12 }).map((month) => `2027-${String(month).padStart(2, '0')}-01`);
    const anyItem = fc.record({ wall: fc.constantFrom(...walls), kind: fc.constantFrom(...keysOf(workKinds)), day, missed: fc.boolean() });
    fc.assert(
      fc.property(fc.uniqueArray(anyItem, { selector: ({ wall, kind }) => `${wall.id} ${kind}` }), (drawn) => {
        const items = drawn.map(({ wall, kind, day: opensOn, missed }) => workItem(wall.id, kind, opensOn, { missedOn: missed ? '2026-10-31' : null }));
        const groups = workGroups(items, walls, today);
        expect(groups.flatMap((group) => group.items)).toHaveLength(items.length);
        expect(new Set(groups.flatMap((group) => group.items))).toEqual(new Set(items));
        for (const group of groups) expect(group.items.map(({ wallId }) => wallId)).toEqual(group.walls.map(({ id }) => id));
      }),
    );
  });
});
