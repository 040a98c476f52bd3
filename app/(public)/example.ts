import { type FadeWall } from '@/components/drawings/fade-time';
import { type HousePlanWall } from '@/components/drawings/plan-layout';
import { type BandMonth } from '@/components/drawings/year-band';
import { type OpeningKind } from '@/lib/plan/elevation';

/** An invented cabin with round figures, drawn on the first page. Nobody's home. */

export const exampleDay = '2026-06-10';
export const examplePlace = { latitude: 45.7, longitude: -111, timeZone: 'America/Denver' };

const color = '#9c5a2b';
const window = (count: number): OpeningKind => ({ kind: 'window', widthM: 0.9, heightM: 1.2, count });
const door: OpeningKind = { kind: 'door', widthM: 0.95, heightM: 2.05, count: 1 };

export type ExampleWall = {
  plan: HousePlanWall;
  gableHeightM: number;
  openings: OpeningKind[];
  /** Share of coat life used up on the example's day. */
  used: number;
  left: string;
};

const wall = (id: string, name: string, azimuthDeg: number, widthM: number, doseKwhM2: number, state: HousePlanWall['state']): HousePlanWall => ({
  id,
  name,
  azimuthDeg,
  widthM,
  eaveDepthM: 0.6,
  doseKwhM2,
  state,
});

export const exampleWalls: ExampleWall[] = [
  { plan: wall('s', 'South', 200, 11, 1080, 'overdue'), gableHeightM: 0, openings: [window(3), door], used: 1, left: 'Used up last fall' },
  { plan: wall('w', 'West', 290, 8, 910, 'due'), gableHeightM: 2.2, openings: [window(2)], used: 0.86, left: '9 months left' },
  { plan: wall('n', 'North', 20, 11, 350, 'later'), gableHeightM: 0, openings: [window(4)], used: 0.5, left: 'Nearly 5 years left' },
  { plan: wall('e', 'East', 110, 8, 760, 'due soon'), gableHeightM: 2.2, openings: [window(1), door], used: 0.74, left: '17 months left' },
];

const fadeWall = (id: string, name: string, lifeMonths: number, stained: string, caulked: string | null, coming: FadeWall['coming'], past: FadeWall['past'] = []): FadeWall => ({
  id,
  name,
  colorHex: color,
  coat: { startedOn: stained, lifeMonths },
  seal: { startedOn: caulked, lifeMonths: lifeMonths * 1.3 },
  past: [{ kind: 'restain', doneOn: stained }, ...(caulked ? [{ kind: 'recaulk' as const, doneOn: caulked }] : []), { kind: 'walkaround', doneOn: '2025-10-11' }, { kind: 'wash', doneOn: '2026-04-25' }, ...past],
  coming,
});

const season = (kind: 'restain' | 'recaulk', year: number) => ({ kind, opensOn: `${year}-06-01`, closesOn: `${year}-09-15` });
const fall = { kind: 'walkaround' as const, opensOn: '2026-10-01', closesOn: '2026-10-31' };
const first = '2021-06-20';

export const exampleFade: FadeWall[] = [
  fadeWall('s', 'South', 51, first, '2019-06-12', [season('restain', 2026), season('recaulk', 2026), fall], [{ kind: 'restain', doneOn: '2017-07-02' }]),
  fadeWall('w', 'West', 69, first, '2019-06-12', [season('restain', 2026), season('recaulk', 2026), fall], [{ kind: 'restain', doneOn: '2017-07-02' }]),
  fadeWall('n', 'North', 118, first, '2021-06-18', [season('restain', 2030), season('recaulk', 2030), fall]),
  fadeWall('e', 'East', 78, first, null, [season('restain', 2027), fall]),
];

export const exampleColor = color;

const cold = 'Nights are below the finish’s limit';
export const exampleMonths: BandMonth[] = [
  { month: 1, rating: 'no', reason: `${cold}: mean low 14 °F` },
  { month: 2, rating: 'no', reason: `${cold}: mean low 16 °F` },
  { month: 3, rating: 'no', reason: `${cold}: mean low 24 °F` },
  { month: 4, rating: 'no', reason: `${cold}: mean low 31 °F` },
  { month: 5, rating: 'marginal', reason: 'Mean low 39 °F, and three dry days in a row are one chance in four' },
  { month: 6, rating: 'good', reason: 'Mean low 46 °F; start after the dew is off' },
  { month: 7, rating: 'good', reason: 'Mean low 52 °F; three dry days in a row are likely' },
  { month: 8, rating: 'good', reason: 'Mean low 50 °F; three dry days in a row are likely' },
  { month: 9, rating: 'good', reason: 'Mean low 42 °F; finish by mid-afternoon' },
  { month: 10, rating: 'marginal', reason: 'Mean low 32 °F: only in a warm spell' },
  { month: 11, rating: 'no', reason: `${cold}: mean low 22 °F` },
  { month: 12, rating: 'no', reason: `${cold}: mean low 14 °F` },
];
