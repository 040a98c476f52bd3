import { ActionForm } from '@/components/ui/action-form';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';

type UndoProps = {
  /** What was done: 'Front was taken out of the home.' */
  done: string;
  label: string;
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  /** Hidden fields of the form; a list under a name like 'wallIds[]'. */
  fields: Record<string, string | readonly string[]>;
};

/** Takes the last act back, right where it was done. */
export function Undo({ done, label, action, fields }: UndoProps) {
  return (
    <div className="course course-honey">
      <ActionForm action={action} className="within flex flex-wrap items-center gap-x-6 gap-y-3 py-4">
        <p className="font-semibold">{done}</p>
        {Object.entries(fields).flatMap(([name, values]) => [values].flat().map((value) => <input key={`${name} ${value}`} type="hidden" name={name} value={value} />))}
        <SubmitButton look="quiet" pendingLabel="Bringing it back…">
          {label}
        </SubmitButton>
      </ActionForm>
    </div>
  );
}
