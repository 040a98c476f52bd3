import { ActionForm } from '@/components/ui/action-form';
import { Course } from '@/components/ui/course';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';

type RemovedHomesProps = { homes: readonly { id: string; name: string; daysLeft: number }[]; restore: (previous: ActionState, form: FormData) => Promise<ActionState> };

/** Homes that were removed and can still be brought back. */
export function RemovedHomes({ homes, restore }: RemovedHomesProps) {
  if (homes.length === 0) return null;
  return (
    <Course heading="Removed homes" aside="After that they are deleted for good." tone="quiet">
      <ul className="grid max-w-3xl gap-3">
        {homes.map(({ id, name, daysLeft }) => (
          <li key={id}>
            <ActionForm action={restore} className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
              <input type="hidden" name="homeId" value={id} />
              <p>
                <strong>{name}</strong>: can be brought back for {daysLeft} more {daysLeft === 1 ? 'day' : 'days'}.
              </p>
              <SubmitButton look="quiet" pendingLabel="Bringing it back…">
                Bring {name} back
              </SubmitButton>
            </ActionForm>
          </li>
        ))}
      </ul>
    </Course>
  );
}
