// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import { CostsForm } from '@/components/budget/costs-form';
import { exampleCosts } from '@/lib/care/costs';
import { costsForm } from '@/lib/schemas/costs';

afterEach(cleanup);

const own = { ...costsForm(exampleCosts.self, 'us'), trip: '75' };
const hired = costsForm(exampleCosts.hired, 'us');

test('changing who does the work fills in the prices of that choice, and going back brings the home’s own', () => {
  render(<CostsForm action={() => Promise.resolve({ ok: true, message: null })} homeId="h1" units="us" start={own} byDoer={{ self: own, hired }} />);
  const trip = screen.getByLabelText<HTMLInputElement>('One trip');
  const restain = screen.getByLabelText<HTMLInputElement>(/^Restain/);
  expect([trip.value, restain.value]).toEqual(['75', '0.511']);
  fireEvent.click(screen.getByLabelText(/A contractor does it/));
  // $450 a trip; $24 a square meter is $2.23 a square foot.
  expect([trip.value, restain.value]).toEqual(['450', '2.23']);
  fireEvent.click(screen.getByLabelText(/I do it myself/));
  expect([trip.value, restain.value]).toEqual(['75', '0.511']);
});
