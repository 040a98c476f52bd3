'use client';

import { type ReactNode, useId, useRef } from 'react';
import { controlClass, describe, FieldFrame, type FrameProps } from '@/components/ui/field-frame';
import { useAnswer } from '@/components/ui/form-context';

type StepperProps = FrameProps & {
  name: string;
  min?: number;
  max?: number;
  step?: number;
  defaultValue?: number | string | undefined;
  unit?: ReactNode;
  onChange?: (value: number) => void;
};

const buttonLook = 'needs-script grid size-14 shrink-0 place-items-center border-2 border-lichen bg-inset text-2xl font-bold leading-none active:bg-line';

/** A number with two large buttons; without scripts a plain number field. */
export function Stepper({ label, hint, optional, name, min, max, step = 1, defaultValue, unit, onChange }: StepperProps) {
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const { error, sent } = useAnswer(name);
  const move = (up: boolean) => {
    const field = input.current;
    if (!field) return;
    if (up) field.stepUp();
    else field.stepDown();
    field.dispatchEvent(new Event('input', { bubbles: true }));
    onChange?.(field.valueAsNumber);
  };
  return (
    <FieldFrame id={id} label={label} hint={hint} optional={optional ?? false} error={error}>
      <div className="flex max-w-80">
        <button type="button" aria-controls={id} aria-label="Less" className={`${buttonLook} rounded-l-md border-r-0`} onClick={() => move(false)}>
          −
        </button>
        <input
          ref={input}
          type="number"
          inputMode="decimal"
          name={name}
          min={min}
          max={max}
          step={step}
          defaultValue={typeof sent === 'string' ? sent : defaultValue}
          onChange={(event) => onChange?.(event.target.valueAsNumber)}
          {...describe(id, hint, error)}
          className={`${controlClass} figures min-w-0 rounded-none text-center text-xl`}
        />
        {unit ? <span className="flex items-center border-y-2 border-lichen bg-snow px-3">{unit}</span> : null}
        <button type="button" aria-controls={id} aria-label="More" className={`${buttonLook} rounded-r-md border-l-0`} onClick={() => move(true)}>
          +
        </button>
      </div>
    </FieldFrame>
  );
}
