'use client';

import { useState } from 'react';
import { ActionForm } from '@/components/ui/action-form';
import { RadioCourses } from '@/components/ui/choice-courses';
import { Field } from '@/components/ui/field';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';

type Props = { action: (previous: ActionState, form: FormData) => Promise<ActionState> };

export function RegisterForm({ action }: Props) {
  const [role, setRole] = useState('homeowner');
  return (
    <ActionForm action={action}>
      <RadioCourses
        legend="Who are you?"
        name="role"
        defaultValue="homeowner"
        onPick={setRole}
        options={[
          { value: 'homeowner', label: 'I look after a home', hint: 'Owner, co-owner or caretaker' },
          { value: 'contractor', label: 'I refinish homes', hint: 'Owners share their homes with you' },
        ]}
      />
      <Field label="Your name" name="name" autoComplete="name" required />
      {role === 'contractor' ? <Field label="Company" name="company" autoComplete="organization" required /> : null}
      <Field label="E-mail address" name="email" type="email" autoComplete="username" inputMode="email" required />
      <Field label="Password" name="password" type="password" autoComplete="new-password" hint="At least 10 characters. Three words in a row are easy to remember." required />
      <SubmitButton pendingLabel="One moment…">Make the account</SubmitButton>
    </ActionForm>
  );
}
