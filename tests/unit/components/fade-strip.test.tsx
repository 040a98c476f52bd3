// @vitest-environment jsdom
import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { FadeStrip, type FadeWall } from '@/components/drawings/fade-strip';
import { stretches, usedUpOn } from '@/components/drawings/fade-stretches';
import { faded, fadeScale, weathered } from '@/components/drawings/fade-time';

afterEach(cleanup);

const today = '2026-06-10';
const south: FadeWall = {
  id: 's',
  name: 'South',
  href: '/walls/s',
  colorHex: '#8a5a32',
  coat: { startedOn: '2021-06-20', lifeMonths: 48 },
  seal: { startedOn: '2019-05-01', lifeMonths: 96 },
  past: [
    { kind: 'restain', doneOn: '2017-07-02' },
    { kind: 'restain', doneOn: '2021-06-20' },
    { kind: 'wash', doneOn: '2026-04-25' },
  ],
  coming: [{ kind: 'restain', opensOn: '2026-07-01', closesOn: '2026-09-15' }],
};

describe('stretches', () => {
  it('fades each coat to the next, shows the used-up time and ends at the coming restain', () => {
    expect(stretches(south, '2016-01-01', '2035-01-01').map(({ what, from, to }) => [what, from, to])).toEqual([
      ['not known', '2016-01-01', '2017-07-02'],
      ['coat', '2017-07-02', '2021-06-20'],
      ['coat', '2021-06-20', '2025-06-20'],
      ['used up', '2025-06-20', '2026-09-15'],
    ]);
  });

  it('starts a coat in its own colour and ends a used-up one in weathered gray', () => {
    const last = stretches(south, '2016-01-01', '2035-01-01')[2];
    expect(last?.what === 'coat' && [last.colors[0], last.colors.at(-1), last.used]).toEqual(['#8a5a32', weathered, 1]);
  });

  it('knows what share of a coat was used up when the next came early: two of four years', () => {
    const early = { ...south, past: [{ kind: 'restain' as const, doneOn: '2019-06-20' }] };
    const first = stretches(early, '2018-01-01', '2035-01-01')[1];
    expect(first?.what === 'coat' && first.used).toBeCloseTo(0.5, 2);
  });

  it('does not make up a coat whose day is not known', () => {
    const unknown = { ...south, coat: { startedOn: null, lifeMonths: 48 }, coming: [] };
    expect(stretches(unknown, '2016-01-01', '2035-01-01')).toEqual([{ what: 'not known', from: '2016-01-01', to: '2035-01-01' }]);
  });
});

describe('fadeScale', () => {
  it('runs from the earliest work to past the last coming work, today in between', () => {
    const scale = fadeScale(today, [south]);
    expect([scale.fromYear, scale.toYear]).toEqual([2017, 2030]);
    expect(scale.at('2017-01-01')).toBe(0);
    expect(scale.at('2030-01-01')).toBe(100);
    expect(scale.at('2023-07-02')).toBeCloseTo(50, 0);
  });

  it('goes back ten years at most', () => {
    expect(fadeScale(today, [{ ...south, past: [{ kind: 'restain', doneOn: '1998-05-05' }] }]).fromYear).toBe(2016);
  });
});

it('fades from the colour to gray and no further', () => {
  expect([faded('#8a5a32', 0), faded('#8a5a32', 1), faded('#8a5a32', 3)]).toEqual(['#8a5a32', weathered, weathered]);
});

it('counts parts of months in days', () => {
  expect(usedUpOn('2021-06-20', 48.5)).toBe('2025-07-05');
});

describe('FadeStrip', () => {
  it('says the same facts in a table and links each wall', () => {
    render(<FadeStrip today={today} walls={[south, { ...south, id: 'n', name: 'North', href: undefined, coat: { startedOn: null, lifeMonths: 90 }, past: [], coming: [] }]} />);
    const rows = within(screen.getByRole('table', { name: /today is June 10, 2026/ })).getAllByRole('row');
    expect(within(rows[1]!).getAllByRole('cell').map((cell) => cell.textContent)).toEqual([
      'from June 20, 2021, used up June 20, 2025',
      'from May 1, 2019, used up May 1, 2027',
      'Restain July 2, 2017; Restain June 20, 2021; Wash April 25, 2026',
      'Restain July 1 – September 15, 2026',
    ]);
    expect(within(rows[2]!).getAllByRole('cell').map((cell) => cell.textContent)).toEqual(['not known', 'from May 1, 2019, used up May 1, 2027', 'nothing known', 'nothing planned']);
    expect(screen.getAllByRole('link').map((link) => link.getAttribute('href'))).toEqual(['/walls/s']);
  });

  it('writes "not known" on the strip of a wall without a date', () => {
    const { container } = render(<FadeStrip today={today} walls={[{ ...south, coat: { startedOn: null, lifeMonths: 48 }, past: [], coming: [] }]} />);
    expect([...container.querySelectorAll('svg text')].map((text) => text.textContent)).toContain('not known');
  });
});
