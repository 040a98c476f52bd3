import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { backupsToKeep } from '@/lib/backup-rotation';

const days = (from: string, count: number) => Array.from({ length: count }, (_, i) => new Date(Date.parse(from) + i * 86_400_000));
const names = (instants: Date[]) => instants.map((at) => at.toISOString().slice(0, 10));

describe('which backups are kept', () => {
  it('are the last of 7 days, 4 weeks and 6 months', () => {
    // One a day at 6:00 through 2026. 31 December 2026 is a Thursday: weeks end on the Sundays 27, 20 and 13 December; months on their last days.
    const kept = backupsToKeep(days('2026-01-01T06:00:00Z', 365));
    expect(names(kept)).toEqual(['2026-12-31', '2026-12-30', '2026-12-29', '2026-12-28', '2026-12-27', '2026-12-26', '2026-12-25', '2026-12-20', '2026-12-13', '2026-11-30', '2026-10-31', '2026-09-30', '2026-08-31', '2026-07-31']);
  });

  it('are all of a few, and the later of two on a day', () => {
    const two = [new Date('2026-05-01T06:00:00Z'), new Date('2026-05-01T18:00:00Z')];
    expect(backupsToKeep(two)).toEqual([two[1]]);
    expect(backupsToKeep([])).toEqual([]);
  });

  it('always have the newest among them, are at most seventeen, and stay kept when rotated again', () => {
    const instants = fc.array(fc.date({ min: new Date('2020-01-01'), max: new Date('2030-01-01'), noInvalidDate: true }), { minLength: 1, maxLength: 80 });
    fc.assert(
      fc.property(instants, (made) => {
        const kept = backupsToKeep(made);
        expect(kept[0]?.getTime()).toBe(Math.max(...made.map((at) => at.getTime())));
        expect(kept.length).toBeLessThanOrEqual(17);
        expect(backupsToKeep(kept)).toEqual(kept);
      }),
    );
  });
});
