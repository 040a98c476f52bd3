'use client';

import { type ReactNode, useId } from 'react';
import { FieldError } from '@/components/ui/field-frame';
import { useAnswer } from '@/components/ui/form-context';
import { type FormValue } from '@/lib/schemas/action-state';

const texts = (sent: FormValue | undefined): string[] => (Array.isArray(sent) ? [...sent].filter((one) => typeof one === 'string') : []);

export type Choice = { value: string; label: ReactNode; hint?: ReactNode; mark?: ReactNode };

type ChoiceProps = {
  legend: ReactNode;
  name: string;
  hint?: ReactNode;
  options: readonly Choice[];
  /** Side by side where there is room; one under another otherwise. */
  inRow?: boolean;
};

type RowsProps = ChoiceProps & { type: 'radio' | 'checkbox'; chosen: readonly string[]; onPick?: ((value: string, checked: boolean) => void) | undefined };

function Rows({ legend, name, hint, options, inRow = false, type, chosen, onPick }: RowsProps) {
  const id = useId();
  const { error } = useAnswer(name);
  const described = [hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter(Boolean).join(' ') || undefined;
  return (
    <fieldset className="grid min-w-0 gap-1.5" aria-describedby={described}>
      <legend className="mb-1.5 font-semibold">{legend}</legend>
      {hint ? (
        <p id={`${id}-hint`} className="text-quiet">
          {hint}
        </p>
      ) : null}
      <div className={`grid overflow-hidden rounded-md border-2 ${error ? 'border-ember' : 'border-lichen'} ${inRow ? 'sm:auto-cols-fr sm:grid-flow-col' : ''}`}>
        {options.map((option) => (
          <label
            key={option.value}
            className={`course flex min-h-14 items-center gap-3 px-4 py-2.5 last:border-b-0 has-checked:bg-inset has-checked:shadow-[inset_6px_0_0_var(--spruce)] has-focus-visible:outline-3 has-focus-visible:-outline-offset-3 has-focus-visible:outline-spruce ${inRow ? 'sm:border-r sm:border-b-0 sm:last:border-r-0' : ''}`}
          >
            <input
              type={type}
              name={name}
              value={option.value}
              defaultChecked={chosen.includes(option.value)}
              onChange={(event) => onPick?.(option.value, event.target.checked)}
              aria-invalid={error ? true : undefined}
              className="size-6 shrink-0 accent-spruce outline-none"
            />
            {option.mark}
            <span className="min-w-0">
              <span className="font-semibold">{option.label}</span>
              {option.hint ? <span className="block text-sm text-quiet">{option.hint}</span> : null}
            </span>
          </label>
        ))}
      </div>
      {error ? <FieldError id={id}>{error}</FieldError> : null}
    </fieldset>
  );
}

/** Pick one: each choice is a course as wide as the form, easy to hit with a thumb. */
export function RadioCourses({ defaultValue, onPick, ...props }: ChoiceProps & { defaultValue?: string | undefined; onPick?: (value: string) => void }) {
  const { sent } = useAnswer(props.name);
  const chosen = typeof sent === 'string' ? sent : defaultValue;
  return <Rows {...props} type="radio" chosen={chosen === undefined ? [] : [chosen]} onPick={(value) => onPick?.(value)} />;
}

/** Pick any number; name it 'wallIds[]' to send a list. */
export function CheckCourses({ defaultValues = [], onPick, ...props }: ChoiceProps & { defaultValues?: readonly string[]; onPick?: (value: string, checked: boolean) => void }) {
  const { sent, wasSent } = useAnswer(props.name);
  return <Rows {...props} type="checkbox" chosen={wasSent ? texts(sent) : defaultValues} onPick={onPick} />;
}
