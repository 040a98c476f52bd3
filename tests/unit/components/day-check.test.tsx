// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { renderToString } from 'react-dom/server';
import { afterEach, describe, expect, it } from 'vitest';
import { DayCheck } from '@/components/day/day-check';
import { ShadeList } from '@/components/day/shade-list';
import { shadeToday } from '@/lib/home/shade-today';

afterEach(cleanup);

const start = { work: 'restain', base: 'waterborne' };
const type = (label: RegExp, value: string) => fireEvent.input(screen.getByLabelText(label), { target: { value } });
const headline = () => screen.queryByRole('heading', { level: 2 })?.textContent;

describe('DayCheck', () => {
  it('answers while one types, as its example says', () => {
    render(<DayCheck start={start} sent={false} units="us" />);
    expect(headline()).toBeUndefined();
    type(/^Temperature now/, '68');
    type(/^Humidity now/, '60');
    expect(headline()).toBe('Go: today is a day to restain');
    type(/^Lowest/, '45');
    expect(headline()).toBe('No: today is no day to restain');
    fireEvent.click(screen.getByLabelText('Recaulk'));
    expect(headline()).toBe('Go: today is a day to recaulk');
  });

  it('is answered without scripts, each check with its limit and source', () => {
    const html = renderToString(<DayCheck start={{ ...start, base: 'oil', temperature: '20', humidity: '50', since: '3' }} sent units="metric" />);
    expect(html).toContain('Wait: not yet a day to restain');
    expect(html).toContain('Wood Handbook, FPL-GTR-190 (2010), p. 16-23: oil and alkyd finishes at 40 °F or warmer');
    expect(html).toContain('from memory, not read again');
    expect(html).toContain('value="20"');
  });

  it('marks what is missing once it was sent, and what cannot be read at once', () => {
    render(<DayCheck start={start} sent={false} units="us" />);
    expect(screen.queryByText('The temperature is missing.')).toBeNull();
    type(/^Humidity now/, '130');
    expect(screen.getByLabelText(/^Humidity now/).getAttribute('aria-invalid')).toBe('true');
    fireEvent.submit(document.querySelector('form')!);
    expect(screen.getByText('The temperature is missing.')).toBeTruthy();
  });
});

describe('ShadeList', () => {
  const home = { latitude: 40, longitude: -105, elevationM: null, timeZone: 'America/Denver', stationId: 'none' };
  const wall = (name: string, azimuthDeg: number) => ({ id: name, name, azimuthDeg, heightM: 2.7, eaveDepthM: 0, eaveDropM: 0, shade: 'open' as const, shadeHeightDeg: 0, cover: 'none' as const, coverDepthM: 0, coverHeightM: 0, coverShare: 1 });

  it('says the walls in the order of work', () => {
    // Due south at 1:09 PM on this day (equation of time −9 minutes, Astronomical Almanac, from memory).
    render(<ShadeList homeId="h" order={shadeToday(home, [wall('East', 90), wall('North', 0), wall('West', 270)], '2027-03-14')} />);
    expect(screen.getAllByRole('listitem').map((item) => item.textContent)).toEqual(['1West: in the shade until 1:10 PM', '2North: in the shade all day', '3East: in the shade from 1:10 PM']);
  });

  it('counts a porch roof that is deeper than the sun is low', () => {
    // At noon on June 21 the sun stands 73° high at 40°: under a roof 2.4 m deep and 2.7 m up its shadow is 7.8 m long.
    const porch = { ...wall('South', 180), cover: 'porch' as const, coverDepthM: 2.4, coverHeightM: 2.7 };
    render(<ShadeList homeId="h" order={shadeToday(home, [porch, { ...porch, id: 'Open', name: 'Open', cover: 'none' }], '2027-06-21')} />);
    expect(screen.getAllByRole('listitem').map((item) => item.textContent?.replace(/\d+:\d+ [AP]M/g, 'a time'))).toEqual(['1Open: in the shade until a time and from a time', '2South: in the shade all day']);
  });

  it('counts a building in front of a wall as shade', () => {
    render(<ShadeList homeId="h" order={shadeToday(home, [{ ...wall('South', 180), shade: 'building', shadeHeightDeg: 80 }], '2027-12-21')} />);
    expect(screen.getByRole('listitem').textContent).toContain('in the shade all day');
  });
});
