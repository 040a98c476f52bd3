// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { ActionForm } from '@/components/ui/action-form';
import { CheckCourses } from '@/components/ui/choice-courses';
import { Field } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';

afterEach(cleanup);

function show(action: (previous: ActionState, form: FormData) => Promise<ActionState>) {
  render(
    <ActionForm action={action} saved="Saved.">
      <Field label="Place" name="place" />
      <Field label="Name" name="walls.0.name" />
      <CheckCourses legend="Walls" name="wallIds[]" options={[{ value: 's', label: 'South' }]} />
      <SubmitButton>Save</SubmitButton>
    </ActionForm>,
  );
  fireEvent.change(screen.getByLabelText('Place'), { target: { value: 'Bozeman' } });
  fireEvent.click(screen.getByRole('button', { name: 'Save' }));
}

describe('ActionForm', () => {
  it('keeps what was entered, ties each fault to its field and goes to the first wrong one', async () => {
    show(async () => ({ ok: false, message: 'Please look at the marked fields.', errors: { wallIds: 'Choose at least one wall.', 'walls.0.name': 'A name is missing.' }, values: { place: 'Bozeman' } }));
    const name = await screen.findByRole('textbox', { name: 'Name', description: 'A name is missing.' });
    expect(name.getAttribute('aria-invalid')).toBe('true');
    expect(document.activeElement).toBe(name);
    expect(screen.getByRole('group', { name: 'Walls', description: 'Choose at least one wall.' })).toBeDefined();
    expect(screen.getByLabelText('Place')).toHaveProperty('value', 'Bozeman');
    expect(screen.getByText('Please look at the marked fields.').closest('[aria-live]')?.getAttribute('aria-live')).toBe('assertive');
  });

  it('says that it is saved', async () => {
    show(async () => ({ ok: true, message: null }));
    expect((await screen.findByText('Saved.')).closest('[aria-live]')?.getAttribute('aria-live')).toBe('polite');
  });

  it('survives a lost connection with everything still there', async () => {
    show(async () => {
      throw new TypeError('Failed to fetch');
    });
    expect(await screen.findByText(/No answer from Eavewright/)).toBeDefined();
    expect(screen.getByLabelText('Place')).toHaveProperty('value', 'Bozeman');
  });

  it('cannot be sent twice while it is being sent', async () => {
    let calls = 0;
    let finish: (state: ActionState) => void = () => {};
    show(() => {
      calls += 1;
      return new Promise((resolve) => (finish = resolve));
    });
    const pending = await screen.findByRole('button', { name: 'Saving…' });
    fireEvent.click(pending);
    finish({ ok: true, message: null });
    await waitFor(() => expect(screen.getByRole('button', { name: 'Save' })).toBeDefined());
    expect(calls).toBe(1);
  });
});
