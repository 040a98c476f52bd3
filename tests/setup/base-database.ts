import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { TestProject } from 'vitest/node';
import { migrateDatabase } from '../../db/migrate';

/** One migrated file per run; each test works on a copy (see fresh-database.ts). */
export default async function setup(project: TestProject) {
  const folder = mkdtempSync(path.join(tmpdir(), 'eavewright-base-'));
  const file = path.join(folder, 'base.db');
  await migrateDatabase(file);
  project.provide('baseDatabase', file);
  return () => rmSync(folder, { recursive: true, force: true });
}

declare module 'vitest' {
  export interface ProvidedContext {
    baseDatabase: string;
  }
}
