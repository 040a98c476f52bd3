import { describe, expect, it } from 'vitest';
import { assumedStart, filmSpans, lastFound, seenFilm } from '@/lib/care/film-spans';

const sound = (on: string) => ({ on, state: 'sound' as const });
const due = (on: string) => ({ on, state: 'due' as const });
const past = (on: string) => ({ on, state: 'past due' as const });

describe('which film a sighting is of', () => {
  it('is the one that was on the wall, on the day of a renewal still the old one', () => {
    const { before, spans } = filmSpans(['2024-06-01', '2018-06-01'], [due('2024-06-01'), sound('2020-05-01'), sound('2025-05-01'), past('2017-05-01')]);
    expect(before).toEqual([past('2017-05-01')]);
    expect(spans).toEqual([
      { startedOn: '2018-06-01', sightings: [sound('2020-05-01'), due('2024-06-01')] },
      { startedOn: '2024-06-01', sightings: [sound('2025-05-01')] },
    ]);
  });

  it('does not depend on the order in which they were written down', () => {
    const sightings = [sound('2020-05-01'), due('2021-05-01'), past('2021-05-01')];
    expect(filmSpans(['2018-06-01'], sightings.toReversed())).toEqual(filmSpans(['2018-06-01'], sightings));
  });
});

describe('what counts of several looks at one film', () => {
  it('is the first of a run that stayed worn, or the latest if it is sound', () => {
    expect(lastFound([])).toBeNull();
    expect(lastFound([sound('2020-04-01'), sound('2021-04-01')])).toEqual(sound('2021-04-01'));
    expect(lastFound([sound('2020-04-01'), due('2021-04-01'), past('2022-04-01')])).toEqual(due('2021-04-01'));
    expect(lastFound([due('2020-04-01'), sound('2021-04-01')])).toEqual(sound('2021-04-01'));
    expect(lastFound([due('2020-04-01'), sound('2021-04-01'), past('2022-04-01')])).toEqual(past('2022-04-01'));
  });

  it('is told with its age', () => {
    // 1 June 2018 to 1 June 2022 is 1461 days: four years of 365.25.
    expect(seenFilm({ startedOn: '2018-06-01', sightings: [due('2022-06-01')] }, 60)).toEqual({ startedOn: '2018-06-01', on: '2022-06-01', state: 'due', ageYears: 4, modelYears: 5 });
    expect(seenFilm({ startedOn: '2018-06-01', sightings: [] }, 60)).toBeNull();
  });
});

describe('the assumed age of a film that nobody knows', () => {
  // A life of 60 months; 60 / 0.85 = 70.6, 60 / 1.15 = 52.2.
  it.each([
    { found: [], start: null },
    { found: [sound('2026-05-01')], start: '2023-11-01' },
    { found: [due('2026-05-01')], start: '2021-05-01' },
    { found: [past('2026-05-01')], start: '2020-06-01' },
    { found: [sound('2026-05-01'), sound('2027-05-01')], start: '2023-11-01' },
    { found: [sound('2026-05-01'), sound('2029-05-01')], start: '2025-01-01' },
    { found: [sound('2026-05-01'), due('2027-05-01')], start: '2022-05-01' },
    { found: [due('2026-05-01'), past('2027-05-01')], start: '2021-05-01' },
  ])('$found', ({ found, start }) => {
    expect(assumedStart(found, 60)).toBe(start);
  });
});
