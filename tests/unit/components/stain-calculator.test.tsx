// @vitest-environment jsdom
import { act, cleanup, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import { SWRConfig } from 'swr';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { StainCalculator } from '@/components/takeoff/stain-calculator';
import { estimateSchema } from '@/lib/schemas/estimate';
import { calculatorStart, exampleWalls } from '@/lib/schemas/calculator-values';
import { stainAnswer } from '@/lib/takeoff/estimate';
import { answerForm } from '@/lib/takeoff/form-answer';

const asked: unknown[] = [];
let fails = false;

beforeEach(() => {
  asked.length = 0;
  fails = false;
  vi.stubGlobal('fetch', async (_url: string, { body }: { body: string }) => {
    asked.push(JSON.parse(body));
    return fails ? new Response('{}', { status: 503 }) : Response.json(stainAnswer(estimateSchema.parse(JSON.parse(body))));
  });
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const start = calculatorStart({ walls: exampleWalls.us }, 'us');
const show = (props: Partial<Parameters<typeof StainCalculator>[0]> = {}) =>
  render(
    <SWRConfig value={{ provider: () => new Map(), dedupingInterval: 0, shouldRetryOnError: false }}>
      <StainCalculator start={start} first={answerForm(props.start ?? start)} {...props} />
    </SWRConfig>,
  );
const result = () => screen.getByRole('region', { name: 'What to buy' });
const type = (label: string, value: string, at = 0) => {
  const field = screen.getAllByRole('textbox', { name: label })[at];
  if (!field) throw new Error(`no field ${label}`);
  fireEvent.input(field, { target: { value } });
  return field;
};
const line = () => screen.getByRole('status').textContent;

describe('StainCalculator', () => {
  // 234 ft² × 1.0597 × 2 coats at 100 ft²/gal (Wood Handbook p. 16-20) and a tenth of waste: 5.46 gal.
  it('shows the estimate that came with the page without asking again', async () => {
    show();
    expect(within(result()).getByText('5.5 gal')).toBeDefined();
    expect(line()).toBe('5.5 gal1 × 5 gal and 2 × 1 qt, $343');
    await act(() => new Promise((done) => setTimeout(done, 300)));
    expect(asked).toEqual([]);
  });

  // 60 ft × 9 ft less 36 ft² is 504 ft², by the same figures 11.75 gal.
  it('answers while one types, and keeps the answer before until the new one is there', async () => {
    show();
    type('Width', '60');
    expect(within(result()).getByText('5.5 gal')).toBeDefined();
    await waitFor(() => expect(within(result()).getByText('11.7 gal')).toBeDefined());
    expect(asked).toHaveLength(1);
    expect(asked[0]).toMatchObject({ units: 'us', walls: [{ widthFt: 60 }] });
  });

  it('says a fault beside its field and holds the amount back', async () => {
    show();
    const width = type('Width', 'wide');
    expect(screen.getByRole('textbox', { name: 'Width', description: /could not be read/ })).toBe(width);
    expect(within(result()).getByText(/marked fields/)).toBeDefined();
    expect(line()).toBe('');
    type('Width', '30');
    await waitFor(() => expect(line()).toContain('5.5 gal'));
  });

  it('adds a wall, moves the keyboard there, and asks for its height only after the field was left', () => {
    show();
    fireEvent.click(screen.getByRole('button', { name: 'Add a wall' }));
    const width = type('Width', '20', 1);
    expect(document.activeElement).toBe(width);
    expect(screen.queryByText('The height is still missing.')).toBeNull();
    expect(within(result()).getByText('Wall 2 does not count yet. The height is still missing.')).toBeDefined();
    fireEvent.blur(screen.getAllByRole('textbox', { name: 'Height' }).filter((field) => (field as HTMLInputElement).name === 'walls.1.height')[0] as HTMLElement);
    expect(screen.getByText('The height is still missing.')).toBeDefined();
    fireEvent.click(screen.getByRole('button', { name: 'Remove wall 1' }));
    expect(screen.getAllByRole('textbox', { name: 'Width' }).map((field) => (field as HTMLInputElement).value)).toEqual(['20']);
  });

  it('changes to metres with everything that was typed', async () => {
    show();
    type('Width', '20');
    fireEvent.click(screen.getByRole('button', { name: /In metres/ }));
    expect(screen.getByRole('textbox', { name: 'Width' })).toHaveProperty('value', '6.096');
    await waitFor(() => expect(line()).toMatch(/^12\.7 L/));
    expect(asked.at(-1)).toMatchObject({ units: 'metric' });
  });

  it('says when the estimate cannot be had, keeps what was typed, and tries again', async () => {
    fails = true;
    show();
    type('Width', '60');
    await waitFor(() => expect(within(result()).getByText(/could not be made/)).toBeDefined());
    expect(screen.getByRole('textbox', { name: 'Width' })).toHaveProperty('value', '60');
    fails = false;
    fireEvent.click(within(result()).getByRole('button', { name: 'Try again' }));
    await waitFor(() => expect(line()).toMatch(/^11\.7 gal/));
  });

  it('takes the walls of a home, and none is an invitation', async () => {
    const walls = [
      { id: 'a', name: 'Front', areaM2: 20, areaText: '215 ft²' },
      { id: 'b', name: 'Back', areaM2: 10, areaText: '108 ft²' },
    ];
    show({ walls, start: calculatorStart({ chosenM2: ['20#a'] }, 'us') });
    expect(screen.getByRole('checkbox', { name: /Front/ })).toHaveProperty('checked', true);
    fireEvent.click(screen.getByRole('checkbox', { name: /Back/ }));
    await waitFor(() => expect(asked.at(-1)).toMatchObject({ areaM2: 30 }));
    fireEvent.click(screen.getByRole('checkbox', { name: /Back/ }));
    fireEvent.click(screen.getByRole('checkbox', { name: /Front/ }));
    expect(within(result()).getByText(/Choose a wall/)).toBeDefined();
  });
});
