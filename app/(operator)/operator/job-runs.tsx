import { type JobRun } from '@/db/queries/job-runs';
import { utcMinute } from '@/lib/calendar-words';

const words: Record<string, string> = {
  replanned: 'planned anew',
  homes: 'homes due',
  items: 'pieces of work',
  deliveries: 'reminders',
  mails: 'mails queued',
  sent: 'sent',
  retried: 'to try again',
  refused: 'refused',
  cancelled: 'not needed any more',
  heldUp: 'held up by the mail server',
  backups: 'backup made and checked',
  removed: 'older backups removed',
  purged: 'removed homes deleted for good',
};

function outcomeOf(run: JobRun): string {
  if (!run.outcome) return 'Still running, or cut off before its end.';
  const counted = Object.entries(run.outcome).filter(([, n]) => n > 0);
  if (counted.length === 0) return run.error ? '' : 'Nothing was due.';
  return `${counted.map(([name, n]) => `${n} ${words[name] ?? name}`).join(', ')}.`;
}

const seconds = (run: JobRun) => (run.finishedAt ? `${((run.finishedAt.getTime() - run.startedAt.getTime()) / 1000).toFixed(1)} s` : '–');

export function JobRuns({ runs }: { runs: JobRun[] }) {
  if (runs.length === 0) return <p>No run yet. The scheduler makes the first one when it starts; the button above makes one now.</p>;
  return (
    <div className="overflow-x-auto" role="region" aria-label="Table of the last runs" tabIndex={0}>
      <table className="w-full text-left">
        <thead>
          <tr className="border-b-2 border-line">
            <th scope="col" className="py-2 pr-6">Started</th>
            <th scope="col" className="py-2 pr-6">Took</th>
            <th scope="col" className="py-2">What came of it</th>
          </tr>
        </thead>
        <tbody>
          {runs.map((run) => (
            <tr key={run.id} className="border-b border-line align-top">
              <td className="py-2 pr-6 whitespace-nowrap">{utcMinute(run.startedAt)}</td>
              <td className="py-2 pr-6 whitespace-nowrap">{seconds(run)}</td>
              <td className="py-2">
                {run.error ? <p className="font-semibold text-ember">Something failed: {run.error}</p> : null}
                {outcomeOf(run)}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
