import { ActionForm } from '@/components/ui/action-form';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';

type Props = { email: string; action: (previous: ActionState, form: FormData) => Promise<ActionState> };

/** Stands above every page until the address is confirmed. */
export function ConfirmBand({ email, action }: Props) {
  return (
    <aside aria-label="Your address is not confirmed" className="course course-honey no-print">
      <ActionForm action={action} saved="Sent. Open the link in it on this device." className="within flex flex-wrap items-center gap-x-6 gap-y-3 py-4">
        <p className="max-w-2xl">
          <strong className="break-words">{email}</strong> is not confirmed yet. Open the link in the mail we sent: no reminder goes out, and nobody can share a home with you, before that.
        </p>
        <SubmitButton look="quiet" pendingLabel="Sending…">
          Send it again
        </SubmitButton>
      </ActionForm>
    </aside>
  );
}
