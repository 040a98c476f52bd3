import { type Metadata } from 'next';
import { requireActor } from '@/app/_server/actor';
import { SignOutButton } from '@/components/account/sign-out-button';
import { ActionForm } from '@/components/ui/action-form';
import { CheckField } from '@/components/ui/check-field';
import { RadioCourses } from '@/components/ui/choice-courses';
import { Course } from '@/components/ui/course';
import { Field } from '@/components/ui/field';
import { PageHead } from '@/components/ui/page-head';
import { SubmitButton } from '@/components/ui/submit-button';
import { profileOf } from '@/db/queries/people';
import { stoppedHomes } from '@/db/queries/reminder-stops';
import { changePassword, remindAgain, saveProfile, signOutEverywhere } from './actions';

export const metadata: Metadata = { title: 'Your account' };

const units = [
  { value: 'us', label: 'Feet, gallons, °F' },
  { value: 'metric', label: 'Meters, liters, °C' },
];

export default async function AccountPage() {
  const actor = await requireActor();
  const profile = profileOf(actor);
  const stopped = stoppedHomes(actor);
  return (
    <main id="main">
      <PageHead title="Your account" lead={profile.email} />
      <Course heading="You">
        <ActionForm action={saveProfile} saved="Saved.">
          <Field label="Your name" name="name" defaultValue={profile.name} autoComplete="name" required />
          {actor.role === 'contractor' ? <Field label="Company" name="company" defaultValue={profile.company ?? ''} autoComplete="organization" required /> : null}
          <RadioCourses legend="Units" name="units" options={units} defaultValue={profile.units} inRow />
          {actor.role === 'homeowner' ? <CheckField label="Remind me by mail" name="remindersOn" defaultChecked={profile.remindersOn} hint="One mail a home, only when something is due" /> : null}
          <SubmitButton>Save</SubmitButton>
        </ActionForm>
      </Course>
      {stopped.length > 0 ? (
        <Course heading="Homes without reminders" aside="You stopped them">
          {stopped.map((home) => (
            <ActionForm key={home.id} action={remindAgain}>
              <input type="hidden" name="homeId" value={home.id} />
              <SubmitButton look="quiet">Remind me again of {home.name}</SubmitButton>
            </ActionForm>
          ))}
        </Course>
      ) : null}
      <Course heading={profile.hasPassword ? 'Change the password' : 'Set a password'} aside="You then sign in anew everywhere">
        <ActionForm action={changePassword}>
          {profile.hasPassword ? <Field label="Password of today" name="current" type="password" autoComplete="current-password" required /> : null}
          <Field label="New password" name="password" type="password" autoComplete="new-password" hint="At least 10 characters. Three words in a row are easy to remember." required />
          <SubmitButton look="quiet">{profile.hasPassword ? 'Change it' : 'Set it'}</SubmitButton>
        </ActionForm>
      </Course>
      <Course heading="Sign out" aside="Lost a phone? Sign out everywhere" tone="quiet">
        <div className="flex flex-wrap gap-3">
          <SignOutButton look="quiet" label="Sign out here" />
          <ActionForm action={signOutEverywhere}>
            <SubmitButton look="quiet" pendingLabel="Signing out…">Sign out everywhere</SubmitButton>
          </ActionForm>
        </div>
      </Course>
    </main>
  );
}
