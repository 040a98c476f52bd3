'use client';

import { useId } from 'react';

type SliderProps = { label: string; /** The value in words, shown and said aloud. */ words: string; max: number; step: number; value: number; onChange: (value: number) => void };

export function Slider({ label, words, max, step, value, onChange }: SliderProps) {
  const id = useId();
  return (
    <div>
      <div className="flex items-baseline justify-between gap-4">
        <label htmlFor={id} className="font-semibold">
          {label}
        </label>
        <span aria-hidden="true" className="figures text-lg">
          {words}
        </span>
      </div>
      <input id={id} type="range" min="0" max={max} step={step} value={value} aria-valuetext={words} onChange={(event) => onChange(event.target.valueAsNumber)} className="slider" />
    </div>
  );
}
