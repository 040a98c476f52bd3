/** So many of the newest days, weeks and months keep their last backup. Our rule. */
const kept = { days: 7, weeks: 4, months: 6 };

const dayOf = (at: Date) => at.toISOString().slice(0, 10);
/** Monday of the week, UTC. */
const weekOf = (at: Date) => dayOf(new Date(at.getTime() - ((at.getUTCDay() + 6) % 7) * 86_400_000));
const monthOf = (at: Date) => at.toISOString().slice(0, 7);

/** The last backup of each of the newest periods. */
function lastOf(newestFirst: readonly Date[], periodOf: (at: Date) => string, most: number): Date[] {
  const seen = new Map<string, Date>();
  for (const at of newestFirst) if (!seen.has(periodOf(at))) seen.set(periodOf(at), at);
  return [...seen.values()].slice(0, most);
}

/**
 * Which backups to keep, by the instants (UTC) at which they were made: the last one of each of the newest 7 days, 4 weeks and
 * 6 months that have any. The newest is always kept. Our rule.
 */
export function backupsToKeep(instants: readonly Date[]): Date[] {
  const newestFirst = [...instants].sort((a, b) => b.getTime() - a.getTime());
  const keep = new Set([...lastOf(newestFirst, dayOf, kept.days), ...lastOf(newestFirst, weekOf, kept.weeks), ...lastOf(newestFirst, monthOf, kept.months)]);
  return newestFirst.filter((at) => keep.has(at));
}
