'use client';

import { type PointerEvent, useId, useRef, useState } from 'react';
import { CompassRing, onRing } from '@/components/drawings/compass-ring';
import { ring, size } from '@/components/drawings/plan-layout';
import { FieldError } from '@/components/ui/field-frame';
import { useAnswer } from '@/components/ui/form-context';
import { directionWord } from '@/lib/home/direction';

type CompassDialProps = {
  /** Degrees clockwise from true north that the front faces, sent under this name. */
  name: string;
  defaultValue?: number;
  label?: string;
  hint?: string;
  /** Proportions of the house, any unit. */
  frontWidth?: number;
  sideWidth?: number;
  onTurn?: (degrees: number) => void;
};

const middle = size / 2;
const wrap = (degrees: number) => ((Math.round(degrees) % 360) + 360) % 360;

/** Turns the house until it stands as the real one does: by finger, by slider, by arrow keys. */
export function CompassDial({ name, defaultValue = 180, label = 'Which way does the front face?', hint, frontWidth = 12, sideWidth = 8, onTurn }: CompassDialProps) {
  const id = useId();
  const { error, sent } = useAnswer(name);
  const [degrees, setDegrees] = useState(wrap(typeof sent === 'string' ? Number(sent) || 0 : defaultValue));
  const grip = useRef<number | null>(null);
  const turnTo = (next: number) => {
    setDegrees(wrap(next));
    onTurn?.(wrap(next));
  };
  const bearing = (event: PointerEvent<SVGSVGElement>) => {
    const box = event.currentTarget.getBoundingClientRect();
    return (Math.atan2(event.clientX - box.left - box.width / 2, -(event.clientY - box.top - box.height / 2)) * 180) / Math.PI;
  };
  return (
    <div className="grid max-w-md gap-2">
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      {hint ? <p id={`${id}-hint`} className="text-quiet">{hint}</p> : null}
      <svg
        viewBox={`0 0 ${size} ${size}`}
        aria-hidden="true"
        className="needs-script mx-auto block h-auto w-full max-w-80 cursor-grab touch-none select-none active:cursor-grabbing"
        onPointerDown={(event) => {
          event.currentTarget.setPointerCapture(event.pointerId);
          grip.current = bearing(event) - degrees;
        }}
        onPointerMove={(event) => grip.current !== null && turnTo(bearing(event) - grip.current)}
        onPointerUp={() => (grip.current = null)}
        onPointerCancel={() => (grip.current = null)}
      >
        <CompassRing />
        <House degrees={degrees} frontWidth={frontWidth} sideWidth={sideWidth} />
      </svg>
      <div className="flex items-center gap-3">
        <input
          id={id}
          type="range"
          name={name}
          min="0"
          max="359"
          step="1"
          value={degrees}
          onChange={(event) => turnTo(event.target.valueAsNumber)}
          aria-valuetext={`${degrees} degrees, front faces ${directionWord(degrees)}`}
          aria-describedby={[hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter(Boolean).join(' ') || undefined}
          className="slider min-w-0 flex-1"
        />
        <span aria-hidden="true" className="figures w-14 text-right text-xl">
          {degrees}°
        </span>
      </div>
      <p aria-hidden="true" className="font-semibold">
        Front faces {directionWord(degrees)}
      </p>
      {error ? <FieldError id={id}>{error}</FieldError> : null}
    </div>
  );
}

function House({ degrees, frontWidth, sideWidth }: { degrees: number; frontWidth: number; sideWidth: number }) {
  const scale = 210 / Math.hypot(frontWidth, sideWidth);
  const [w, d] = [frontWidth * scale, sideWidth * scale];
  const tip = onRing(degrees, ring - 16);
  return (
    <>
      <line x1={middle} y1={middle} x2={tip.x} y2={tip.y} stroke="var(--spruce)" strokeWidth="4" strokeDasharray="2 8" strokeLinecap="round" />
      <g transform={`rotate(${degrees - 180} ${middle} ${middle})`}>
        <rect x={middle - w / 2} y={middle - d / 2} width={w} height={d} fill="var(--inset)" stroke="var(--ink)" strokeWidth="8" />
        <line x1={middle - w / 2} x2={middle + w / 2} y1={middle + d / 2} y2={middle + d / 2} stroke="var(--spruce)" strokeWidth="16" />
        <rect x={middle - 11} y={middle + d / 2 - 9} width="22" height="18" fill="var(--snow)" stroke="var(--ink)" strokeWidth="3" />
        <path d={`M${middle - 12} ${ring + middle - 30} L${middle} ${ring + middle - 12} L${middle + 12} ${ring + middle - 30} Z`} fill="var(--spruce)" />
      </g>
      <text x={middle} y={middle + 6} textAnchor="middle" fontSize="18" fontWeight="700" fill="var(--ink)" stroke="var(--inset)" strokeWidth="6" paintOrder="stroke">
        {degrees}°
      </text>
    </>
  );
}
