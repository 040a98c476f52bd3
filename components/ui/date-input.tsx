'use client';

import { useId, useRef, useState } from 'react';
import { controlClass, describe, FieldFrame, type FrameProps } from '@/components/ui/field-frame';
import { useAnswer } from '@/components/ui/form-context';

type DateInputProps = FrameProps & {
  name: string;
  defaultValue?: string | undefined;
  min?: string;
  max?: string;
  /** Buttons that fill the day in: today, yesterday. */
  quick?: readonly { label: string; value: string }[];
  /** Name of a second field: "not known" is an answer, and empties the day. */
  notKnownName?: string;
  defaultNotKnown?: boolean;
};

/** A calendar day, 'YYYY-MM-DD', in the device's own picker. */
export function DateInput({ label, hint, optional, name, defaultValue, min, max, quick = [], notKnownName = '', defaultNotKnown = false }: DateInputProps) {
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const { error, sent, wasSent } = useAnswer(name);
  const unknown = useAnswer(notKnownName);
  const [notKnown, setNotKnown] = useState(wasSent ? unknown.sent === 'on' : defaultNotKnown);
  return (
    <FieldFrame id={id} label={label} hint={hint} optional={optional ?? false} error={error}>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <input
          ref={input}
          type="date"
          name={name}
          min={min}
          max={max}
          defaultValue={typeof sent === 'string' ? sent : defaultValue}
          onChange={(event) => event.target.value && setNotKnown(false)}
          {...describe(id, hint, error)}
          className={`${controlClass} max-w-56`}
        />
        {quick.map((day) => (
          <button
            key={day.value}
            type="button"
            className="needs-script min-h-12 rounded-md border-2 border-lichen bg-inset px-4 font-semibold"
            onClick={() => {
              setNotKnown(false);
              fill(input.current, day.value);
            }}
          >
            {day.label}
          </button>
        ))}
        {notKnownName ? (
          <label className="flex min-h-12 items-center gap-3">
            <input
              type="checkbox"
              name={notKnownName}
              checked={notKnown}
              onChange={(event) => {
                setNotKnown(event.target.checked);
                if (event.target.checked) fill(input.current, '');
              }}
              className="size-6 accent-spruce"
            />
            Not known
          </label>
        ) : null}
      </div>
    </FieldFrame>
  );
}

function fill(field: HTMLInputElement | null, day: string) {
  if (!field) return;
  field.value = day;
  field.dispatchEvent(new Event('input', { bubbles: true }));
}
