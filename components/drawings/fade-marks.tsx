import { weathered } from '@/components/drawings/fade-time';
import { type WorkKind, workKinds } from '@/lib/schemas/vocabulary';

/** 16 by 16, around (0, 0). Restain: a brush-wide bar; recaulk: a bead; wash: a drop; walkaround: an eye. */
const marks: Record<WorkKind, string> = {
  restain: 'M-4-13h8v26h-8z',
  recaulk: 'M-5 0a5 5 0 1 0 10 0a5 5 0 1 0-10 0',
  wash: 'M0-8C4-2.5 5 0 5 2.5a5 5 0 0 1-10 0C-5 0-4-2.5 0-8z',
  walkaround: 'M0-6 6 0 0 6-6 0z',
};

type FadeMarkProps = { kind: WorkKind; done: boolean };

/** Done work is filled, coming work an outline. */
export function FadeMark({ kind, done }: FadeMarkProps) {
  const path = marks[kind];
  return done ? (
    <path d={path} fill="var(--ink)" stroke="var(--snow)" strokeWidth="1.5" />
  ) : (
    <path d={path} fill="var(--snow)" stroke="var(--ink)" strokeWidth="2" strokeDasharray={kind === 'restain' ? '4 2.5' : undefined} />
  );
}

export function FadeLegend() {
  const item = (kind: WorkKind, done: boolean) => (
    <svg width="18" height="30" viewBox="-9 -15 18 30" aria-hidden="true" className="shrink-0">
      <FadeMark kind={kind} done={done} />
    </svg>
  );
  return (
    <ul aria-hidden="true" className="mt-2 flex flex-wrap items-center gap-x-5 text-sm text-quiet">
      <li className="flex items-center gap-2">
        <svg width="34" height="16" aria-hidden="true">
          <rect width="34" height="16" fill="#8a5a32" />
          <path d="M0 0L34 16V0Z" fill={weathered} />
          <path d="M0 0L34 16" stroke="#fff" strokeWidth="1.5" />
        </svg>
        Coat left
      </li>
      {(Object.keys(workKinds) as WorkKind[]).map((kind) => (
        <li key={kind} className="flex items-center gap-1">
          {item(kind, true)}
          {workKinds[kind]}
        </li>
      ))}
      <li className="flex items-center gap-1">
        {item('recaulk', false)}
        Outline: to come
      </li>
      <li className="flex items-center gap-2">
        <svg width="26" height="8" aria-hidden="true">
          <rect width="26" height="5" y="1.5" fill="var(--lichen)" />
        </svg>
        Caulk
      </li>
    </ul>
  );
}
