// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, expect, it } from 'vitest';
import { CoverFields } from '@/components/home/cover-fields';
import { FormContext } from '@/components/ui/form-context';
import { noCover } from '@/lib/home/form-values';

afterEach(cleanup);

const sent = () => Object.fromEntries(new FormData(document.querySelector('form')!).entries());

it('sends what is stored of a porch roof, also while none is chosen', () => {
  const porch = { cover: 'porch' as const, coverDepth: '8', coverHeight: '7 ft 6 in', coverShare: '0.5' as const };
  render(<form><CoverFields values={porch} units="us" /></form>);
  expect(sent()).toEqual(porch);
  screen.getByRole<HTMLInputElement>('radio', { name: /^Nothing/ }).click();
  expect(sent()).toEqual({ ...porch, cover: 'none' });
});

it('asks nothing further where there is nothing, and marks a wrong height with what was typed', () => {
  const { unmount } = render(<form><CoverFields values={noCover} units="us" /></form>);
  expect(sent()).toEqual(noCover);
  unmount();
  const answer = { ok: false as const, message: null, errors: { coverHeight: 'Too high.' }, values: { ...noCover, cover: 'deck', coverHeight: '40', coverShare: '0.25' } };
  render(<form><FormContext value={answer}><CoverFields values={noCover} units="us" /></FormContext></form>);
  expect(sent()).toEqual({ cover: 'deck', coverDepth: '', coverHeight: '40', coverShare: '0.25' });
  expect(screen.getByLabelText(/^How high/).getAttribute('aria-invalid')).toBe('true');
  expect(screen.getByText('Too high.')).toBeTruthy();
});
