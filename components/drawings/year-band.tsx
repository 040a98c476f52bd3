import { monthNames } from '@/lib/calendar-words';

export type MonthRating = 'good' | 'marginal' | 'no';
export type BandMonth = { /** 1 to 12 */ month: number; rating: MonthRating; reason: string };

const words: Record<MonthRating, string> = { good: 'Good', marginal: 'Marginal', no: 'No' };

type YearBandProps = { months: readonly BandMonth[]; /** This month, 1 to 12, is marked. */ now?: number; label?: string };

/** Twelve cells: in which months a coat can cure here, and why not in the others. */
export function YearBand({ months, now, label = 'Months in which a coat can cure here' }: YearBandProps) {
  return (
    <figure className="min-w-0">
      <ol aria-label={label} className="grid grid-cols-12 gap-px sm:gap-0.5">
        {months.map((cell) => (
          <li key={cell.month} title={`${name(cell.month)}: ${cell.rating}. ${cell.reason}`} className="min-w-0 text-center">
            <span aria-hidden="true" className={`block text-sm ${cell.month === now ? 'font-bold underline decoration-2 underline-offset-4' : ''}`}>
              {name(cell.month).slice(0, 1)}
              <span className="max-md:hidden">{name(cell.month).slice(1, 3)}</span>
            </span>
            <span className="sr-only">
              {name(cell.month)}
              {cell.month === now ? ' (this month)' : ''}: {cell.rating}. {cell.reason}
            </span>
            <Cell rating={cell.rating} />
          </li>
        ))}
      </ol>
      <details className="no-print mt-1">
        <summary className="flex min-h-11 items-center gap-4 text-sm text-quiet">
          <span className="link">Why each month</span>
          <Legend />
        </summary>
        <ul aria-label="Reasons" className="mt-1 grid gap-x-8 md:grid-cols-2">
          {months.map((cell) => (
            <li key={cell.month} className="grid grid-cols-[2.75rem_5rem_minmax(0,1fr)] gap-2 border-b border-line py-1.5 text-sm">
              <b>{name(cell.month).slice(0, 3)}</b>
              <span>{words[cell.rating]}</span>
              <span>{cell.reason}</span>
            </li>
          ))}
        </ul>
      </details>
    </figure>
  );
}

const name = (month: number) => monthNames[month - 1] ?? '';

/** Good: filled with a tick. Marginal: filled to half. No: empty with a stroke through. */
function Cell({ rating, small = false }: { rating: MonthRating; small?: boolean }) {
  return (
    <svg aria-hidden="true" viewBox="0 0 40 40" preserveAspectRatio="none" className={`mt-1 block ${small ? 'inline-block h-4 w-5' : 'h-11 w-full'}`}>
      <rect x="0.75" y="0.75" width="38.5" height="38.5" fill="var(--snow)" stroke="var(--ink)" strokeWidth="1.5" vectorEffect="non-scaling-stroke" />
      {rating === 'good' ? <rect width="40" height="40" fill="var(--spruce)" /> : null}
      {rating === 'marginal' ? <rect y="20" width="40" height="20" fill="var(--honey)" stroke="var(--ink)" strokeWidth="1.5" vectorEffect="non-scaling-stroke" /> : null}
      <path
        d={{ good: 'M11 21l6 7 12-15', marginal: '', no: 'M13 13 27 27' }[rating]}
        fill="none"
        stroke={rating === 'good' ? 'var(--on-spruce)' : 'var(--lichen)'}
        strokeWidth="2.5"
        strokeLinecap="round"
        vectorEffect="non-scaling-stroke"
      />
    </svg>
  );
}

function Legend() {
  return (
    <span aria-hidden="true" className="flex flex-wrap gap-x-3">
      {(Object.keys(words) as MonthRating[]).map((rating) => (
        <span key={rating} className="flex items-center gap-1.5">
          <Cell rating={rating} small />
          {words[rating].toLowerCase()}
        </span>
      ))}
    </span>
  );
}
