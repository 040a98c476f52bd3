import { describe, expect, test } from 'vitest';
import { type Job, type JobHome, workAhead } from '@/lib/jobs/work-ahead';
import { type WorkKind } from '@/lib/schemas/vocabulary';
import { workItem } from '@/tests/fixtures/work-item';

const home = (id: string, values: Partial<JobHome> = {}): JobHome => ({ id, name: id, place: '', state: 'MT', timeZone: 'America/Denver', sidingNominalIn: 8, crownHeightM: 0.0254, ...values });

/** A wall of 30 ft × 9 ft less three windows of 3 ft × 4 ft: 234 ft². */
const job = (of: JobHome, position: number, kind: WorkKind, opensOn: string, values: Parameters<typeof workItem>[3] & { texture?: 'smooth' | 'saw-textured' } = {}): Job => {
  const { texture = 'saw-textured', ...item } = values;
  const id = `${of.id} ${position}`;
  return {
    home: of,
    wall: { id, name: `Wall ${position}`, position, azimuthDeg: 180, widthM: 9.144, heightM: 2.7432, gableHeightM: 0, corners: 2, pipes: 0, texture },
    openings: [{ widthM: 0.9144, heightM: 1.2192, count: 3 }],
    item: workItem(id, kind, opensOn, item),
  };
};

const now = new Date('2026-12-01T18:00:00Z');
const cabin = home('Cabin');
const lodge = home('Lodge');
const shape = (visits: ReturnType<typeof workAhead>['seasons'][number]['visits']) => visits.map(({ home: { id }, rows }) => [id, rows.map(({ wallName, works }) => [wallName, works.map(({ kind }) => kind).join(' ')])]);

describe('workAhead', () => {
  test('is empty without work', () => {
    expect(workAhead([], now, 'us')).toEqual({ overdue: null, seasons: [] });
  });

  test('goes year by year, home by home, walls in plan order, caulk before stain', () => {
    const jobs = [
      job(lodge, 0, 'restain', '2027-07-01'),
      job(cabin, 2, 'restain', '2027-06-01'),
      job(cabin, 0, 'restain', '2027-06-01'),
      job(cabin, 0, 'recaulk', '2027-06-01'),
      job(cabin, 1, 'restain', '2029-06-01'),
    ];
    const { overdue, seasons } = workAhead(jobs, now, 'us');
    expect(overdue).toBeNull();
    expect(seasons.map(({ year, opensOn, closesOn }) => [year, opensOn, closesOn])).toEqual([[2027, '2027-06-01', '2027-07-28'], [2029, '2029-06-01', '2029-06-28']]);
    expect(seasons.map(({ visits }) => shape(visits))).toEqual([
      [
        ['Cabin', [['Wall 0', 'recaulk restain'], ['Wall 2', 'restain']]],
        ['Lodge', [['Wall 0', 'restain']]],
      ],
      [['Cabin', [['Wall 1', 'restain']]]],
    ]);
  });

  test('windows of one home that share no day are two visits', () => {
    const { seasons } = workAhead([job(cabin, 0, 'restain', '2027-04-01'), job(cabin, 1, 'restain', '2027-09-01')], now, 'us');
    expect(seasons.map(({ visits }) => visits.map(({ opensOn }) => opensOn))).toEqual([['2027-04-01', '2027-09-01']]);
    expect(seasons[0]?.totals.homes).toBe(1);
  });

  test('what is overdue stands apart, and counts into the season of its next chance', () => {
    const jobs = [job(cabin, 0, 'restain', '2027-06-01', { missedOn: '2026-08-31' }), job(cabin, 1, 'restain', '2027-06-01'), job(lodge, 0, 'recaulk', '2029-06-01')];
    const { overdue, seasons } = workAhead(jobs, now, 'us');
    expect(shape(overdue?.visits ?? [])).toEqual([['Cabin', [['Wall 0', 'restain']]]]);
    expect(overdue?.visits[0]?.rows[0]?.works[0]?.state).toBe('overdue');
    const [season, caulkOnly] = seasons;
    expect(season?.totals.works).toBe(1);
    expect(season?.withOverdue).toMatchObject({ homes: 1, works: 2, stainM2: 2 * (season?.totals.stainM2 ?? NaN), buyL: 2 * (season?.totals.buyL ?? NaN) });
    expect(caulkOnly).toMatchObject({ withOverdue: null, totals: { works: 1, stainM2: 0, buyL: 0 } });
    expect(caulkOnly?.visits[0]?.stain).toBeNull();
  });

  test('overdue is by the day at the home', () => {
    const atMidnight = new Date('2027-06-29T05:00:00Z'); // June 28 in Montana, June 29 in New York
    const days = (timeZone: string) => workAhead([job(home('Cabin', { timeZone }), 0, 'restain', '2027-06-01')], atMidnight, 'us').overdue !== null;
    expect([days('America/Denver'), days('America/New_York')]).toEqual([false, true]);
  });

  // 234 ft² × 1.0597 (exact geometry of 6.625 in by 1 in) × 2 coats at 100–200 ft²/gal rough, 200–400 smooth (Wood Handbook p. 16-20), and a tenth of waste.
  test('stain by each wall’s own surface', () => {
    const rough = workAhead([job(cabin, 0, 'restain', '2027-06-01')], now, 'us').seasons[0]?.visits[0]?.stain;
    expect(rough?.lowGal).toBeCloseTo(2.48, 2);
    expect(rough?.highGal).toBeCloseTo(4.96, 2);
    expect(rough?.buyGal).toBeCloseTo(1.1 * 4.9594, 3);
    const both = workAhead([job(cabin, 0, 'restain', '2027-06-01'), job(cabin, 1, 'restain', '2027-06-01', { texture: 'smooth' })], now, 'metric').seasons[0]?.visits[0]?.stain;
    expect(both?.highGal).toBeCloseTo(4.9594 * 1.5, 3);
    expect(both?.explanation.inputs.map(({ label, value }) => `${label}: ${value}`)).toContain('Coverage, smooth: 4.9–9.8 m² per litre and coat');
    expect(both?.containers.reduce((sum, { gal, count }) => sum + gal * count, 0)).toBeGreaterThanOrEqual(both?.buyGal ?? NaN);
  });
});
