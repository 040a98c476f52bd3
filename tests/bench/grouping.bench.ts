import { bench, describe } from 'vitest';
import { planHome } from '@/lib/care';
import { chooseGrouping } from '@/lib/care/choose-grouping';
import { filmJobs } from '@/lib/care/film-jobs';
import { careHome, careRecord, careWall } from '@/tests/fixtures/care-home';

/** A home of eight walls, stained and caulked in different years, against one plan of the same home. */
const walls = Array.from({ length: 8 }, (_, i) => careWall({ id: `w${i}`, name: `Wall ${i}`, position: i, doseKwhM2: 300 + 120 * i }));
const records = walls.flatMap(({ id }, i) => [careRecord('restain', `202${i % 5}-07-0${i + 1}`, { wallIds: [id] }), careRecord('recaulk', `201${i % 9}-06-1${i}`, { wallIds: [id] })]);
const home = careHome({ walls, records });

describe('eight walls', () => {
  bench('one plan', () => {
    planHome(home, '2026-12-01');
  });

  const { walls: plans } = planHome(home, '2026-12-01');
  bench('nine choices of grouping, twenty years each', () => {
    chooseGrouping(filmJobs(home, plans), home.costs.tripCents);
  });
});
