// @vitest-environment jsdom
import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { MonthlySun } from '@/components/charts/monthly-sun';
import { Figure } from '@/components/ui/figure';
import { Measure, Money } from '@/components/ui/measure';
import { StateMark } from '@/components/ui/state-mark';

afterEach(cleanup);

it('Figure shows inputs, formula and who says so', () => {
  const { container } = render(
    <Figure
      value="4 years"
      explanation={{
        figure: 'Coat life',
        value: '48 months',
        formula: 'high − severity × (high − low)',
        inputs: [{ label: 'Severity', value: '0.58' }],
        sources: [
          { text: 'Wood Handbook, table 16-4', ground: 'published' },
          { text: 'Place on the range', ground: 'our rule' },
        ],
      }}
    />,
  );
  expect(container.querySelector('summary')?.textContent).toContain('Coat life4 years');
  expect(screen.getByText('Coat life = high − severity × (high − low)')).toBeDefined();
  expect(screen.getByText('Severity').nextSibling?.textContent).toBe('0.58');
  expect(screen.getAllByRole('listitem', { hidden: true }).map((item) => item.textContent)).toEqual(['Wood Handbook, table 16-4 (published)', 'Place on the range (our rule)']);
});

it('MonthlySun has its figures as a table', () => {
  render(<MonthlySun wallName="South" doseMonthly={Array.from({ length: 12 }, (_, i) => 60.4 + i)} />);
  const rows = within(screen.getByRole('table', { hidden: true })).getAllByRole('row', { hidden: true });
  expect(rows).toHaveLength(13);
  expect([rows[1]?.textContent, rows[12]?.textContent]).toEqual(['January60', 'December71']);
});

describe('Measure and Money', () => {
  it('speak the reader’s units', () => {
    const { container } = render(
      <>
        <Measure kind="length" value={9.144} units="us" />; <Measure kind="length" value={9.144} units="metric" />; <Money cents={125_000} />; <Money cents={450} />
      </>,
    );
    expect(container.textContent).toBe('30 ft; 9.14 m; $1,250; $4.50');
  });
});

it('StateMark has a word for every state and no two shapes alike', () => {
  const states = ['later', 'due soon', 'due', 'overdue', 'done', 'put off', 'not known'] as const;
  const drawn = states.map((state) => render(<StateMark state={state} />).container);
  expect(drawn.map((one) => one.textContent)).toEqual(['Later', 'Due soon', 'Due', 'Overdue', 'Done', 'Put off', 'Not known']);
  const shape = (one: HTMLElement) => [...one.querySelectorAll('path')].map((path) => `${path.getAttribute('d')} ${path.getAttribute('fill') === 'none' ? 'line' : 'filled'}`).join();
  expect(new Set(drawn.map(shape)).size).toBe(states.length);
});
