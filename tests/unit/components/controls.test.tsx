// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { CompassDial } from '@/components/drawings/compass-dial';
import { SunSlider } from '@/components/drawings/sun-slider';
import { YearBand } from '@/components/drawings/year-band';
import { currentLink } from '@/components/ui/nav-links';
import { Stepper } from '@/components/ui/stepper';
import { DateInput } from '@/components/ui/date-input';

afterEach(cleanup);

const sent = (form: HTMLElement) => Object.fromEntries(new FormData(form as HTMLFormElement).entries());

describe('CompassDial', () => {
  it('is a slider in the form that says where the front faces', () => {
    const { container } = render(
      <form>
        <CompassDial name="compassDeg" defaultValue={180} />
      </form>,
    );
    const slider = screen.getByRole('slider', { name: 'Which way does the front face?' });
    expect(slider.getAttribute('aria-valuetext')).toBe('180 degrees, front faces south');
    fireEvent.change(slider, { target: { value: '225' } });
    expect(slider.getAttribute('aria-valuetext')).toBe('225 degrees, front faces south-west');
    expect(sent(container.querySelector('form')!)).toEqual({ compassDeg: '225' });
  });
});

describe('SunSlider', () => {
  const walls = [180, 270, 0, 90].map((azimuthDeg, i) => ({ id: String(i), name: ['South', 'West', 'North', 'East'][i]!, azimuthDeg, widthM: 9, eaveDepthM: 0.5, doseKwhM2: 800 }));

  it('puts the sun where NREL/TP-560-34302 does on October 17, 2003, 12:30 MST at Golden: 194.3°, 39.9° high', () => {
    render(<SunSlider walls={walls} place={{ latitude: 39.742476, longitude: -105.1786, timeZone: 'America/Denver' }} day="2003-10-17" minutes={13 * 60 + 30} />);
    expect(screen.getByRole('status').textContent).toBe('The sun stands in the south, 40° high. In the sun: South, West.');
  });

  it('moves with the sliders: at midnight every wall is dark', () => {
    render(<SunSlider walls={walls} place={{ latitude: 39.742476, longitude: -105.1786, timeZone: 'America/Denver' }} day="2003-10-17" />);
    fireEvent.change(screen.getByRole('slider', { name: 'Time of day' }), { target: { value: '0' } });
    expect(screen.getByRole('status').textContent).toContain('below the horizon');
    expect(screen.getAllByRole('img', { name: /in shade now/ })).toHaveLength(4);
  });
});

it('YearBand says each month with its rating and reason', () => {
  render(<YearBand now={6} months={[{ month: 5, rating: 'marginal', reason: 'Nights near the limit.' }, { month: 6, rating: 'good', reason: 'Warm and dry.' }]} label="Months" />);
  const items = within(screen.getByRole('list', { name: 'Months' })).getAllByRole('listitem');
  expect(items.map((item) => item.textContent)).toEqual(['May' + 'May: marginal. Nights near the limit.', 'Jun' + 'June (this month): good. Warm and dry.']);
});

it('Stepper moves by its step and stays within its bounds', () => {
  const { container } = render(
    <form>
      <Stepper label="Windows" name="count" min={0} max={3} defaultValue={2} />
    </form>,
  );
  const press = (name: string, times: number) => Array.from({ length: times }).forEach(() => fireEvent.click(screen.getByRole('button', { name })));
  press('More', 3);
  expect(sent(container.querySelector('form')!)).toEqual({ count: '3' });
  press('Less', 5);
  expect(sent(container.querySelector('form')!)).toEqual({ count: '0' });
});

it('DateInput takes a quick day, or "not known", which empties it', () => {
  const { container } = render(
    <form>
      <DateInput label="When?" name="on" notKnownName="notKnown" quick={[{ label: 'Today', value: '2026-06-10' }]} />
    </form>,
  );
  const form = container.querySelector('form')!;
  fireEvent.click(screen.getByRole('button', { name: 'Today' }));
  expect(sent(form)).toEqual({ on: '2026-06-10' });
  fireEvent.click(screen.getByRole('checkbox', { name: 'Not known' }));
  expect(sent(form)).toEqual({ on: '', notKnown: 'on' });
});

it('marks the longest matching link as the current one', () => {
  const links = ['/homes', '/homes/new', '/settings'].map((href) => ({ href, label: href }));
  expect([currentLink(links, '/homes/new'), currentLink(links, '/homes/7/log'), currentLink(links, '/homestead')]).toEqual(['/homes/new', '/homes', undefined]);
});
