'use client';

import { type ComponentProps, type ReactNode, useId } from 'react';
import { controlClass, describe, FieldFrame, type FrameProps } from '@/components/ui/field-frame';
import { useAnswer } from '@/components/ui/form-context';

const text = (sent: unknown, fallback: string | number | undefined) => (typeof sent === 'string' ? sent : fallback);

type FieldProps = FrameProps &
  Omit<ComponentProps<'input'>, 'className' | 'id' | 'name' | 'defaultValue'> & {
    name: string;
    defaultValue?: string | number | undefined;
    /** Stands behind the control: 'ft', 'gal'. */
    unit?: ReactNode;
  };

/** One line of text, a number, an e-mail address, a password … */
export function Field({ label, hint, optional, name, defaultValue, unit, ...input }: FieldProps) {
  const id = useId();
  const { error, sent } = useAnswer(name);
  const control = (
    <input {...input} {...describe(id, hint, error)} name={name} defaultValue={text(sent, defaultValue)} className={`${controlClass} ${unit ? 'rounded-r-none' : ''}`} />
  );
  return (
    <FieldFrame id={id} label={label} hint={hint} optional={optional ?? false} error={error}>
      {unit ? (
        <div className="flex">
          {control}
          <span className="flex min-w-14 items-center justify-center rounded-r-md border-2 border-l-0 border-lichen bg-inset px-3 whitespace-nowrap">{unit}</span>
        </div>
      ) : (
        control
      )}
    </FieldFrame>
  );
}

type TextAreaProps = FrameProps & Omit<ComponentProps<'textarea'>, 'className' | 'id' | 'name' | 'defaultValue'> & { name: string; defaultValue?: string | undefined };

export function TextArea({ label, hint, optional, name, defaultValue, rows = 4, ...area }: TextAreaProps) {
  const id = useId();
  const { error, sent } = useAnswer(name);
  return (
    <FieldFrame id={id} label={label} hint={hint} optional={optional ?? false} error={error}>
      <textarea {...area} {...describe(id, hint, error)} rows={rows} name={name} defaultValue={text(sent, defaultValue)} className={controlClass} />
    </FieldFrame>
  );
}

type SelectProps = FrameProps &
  Omit<ComponentProps<'select'>, 'className' | 'id' | 'name' | 'defaultValue' | 'children'> & {
    name: string;
    options: Record<string, string> | readonly { value: string; label: string }[];
    defaultValue?: string | undefined;
    /** First, empty choice. */
    empty?: string;
  };

export function SelectField({ label, hint, optional, name, options, defaultValue, empty, ...select }: SelectProps) {
  const id = useId();
  const { error, sent } = useAnswer(name);
  const list = Array.isArray(options) ? options : Object.entries(options).map(([value, words]) => ({ value, label: words }));
  return (
    <FieldFrame id={id} label={label} hint={hint} optional={optional ?? false} error={error}>
      <select {...select} {...describe(id, hint, error)} name={name} defaultValue={text(sent, defaultValue)} className={controlClass}>
        {empty !== undefined ? <option value="">{empty}</option> : null}
        {list.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </FieldFrame>
  );
}
