'use client';

import { type ReactNode, useId, useRef } from 'react';
import { ActionForm } from '@/components/ui/action-form';
import { Button, type ButtonLook } from '@/components/ui/button';
import { SubmitButton } from '@/components/ui/submit-button';
import { type ActionState } from '@/lib/schemas/action-state';

type ConfirmProps = {
  /** On the button that asks. */
  label: ReactNode;
  look?: ButtonLook;
  /** The question; names the thing: 'Remove the home "Larch Ridge"?' */
  question: ReactNode;
  /** What goes and what stays. */
  children?: ReactNode;
  /** On the button that does it: 'Remove the home'. */
  confirm: ReactNode;
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  /** Hidden fields of the form. */
  fields: Record<string, string>;
};

/** Asks once before an act that cannot be taken back. */
export function Confirm({ label, look = 'plain', question, children, confirm, action, fields }: ConfirmProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  const close = () => dialog.current?.close();
  return (
    <>
      <Button look={look} aria-haspopup="dialog" onClick={() => dialog.current?.showModal()}>
        {label}
      </Button>
      <dialog
        ref={dialog}
        aria-labelledby={titleId}
        className="course m-auto w-[min(34rem,calc(100vw-2rem))] rounded-md p-0 text-ink"
        onClick={(event) => event.target === event.currentTarget && close()}
      >
        <ActionForm action={action} onSaved={close} className="grid gap-4 p-6">
          <h2 id={titleId}>{question}</h2>
          {children ? <div>{children}</div> : null}
          {Object.entries(fields).map(([name, value]) => (
            <input key={name} type="hidden" name={name} value={value} />
          ))}
          <div className="flex flex-wrap gap-3">
            <SubmitButton look="destructive" pendingLabel="Working…">
              {confirm}
            </SubmitButton>
            <Button look="quiet" onClick={close}>
              Keep it
            </Button>
          </div>
        </ActionForm>
      </dialog>
    </>
  );
}
