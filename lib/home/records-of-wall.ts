type Recorded = { wallIds: readonly string[]; findings: readonly { wallId: string }[] };

/** The work that was done on a wall, with what was found on this wall only. */
export const recordsOfWall = <R extends Recorded>(records: readonly R[], wallId: string): R[] =>
  records.filter(({ wallIds }) => wallIds.includes(wallId)).map((record) => ({ ...record, findings: record.findings.filter((one) => one.wallId === wallId) }));
