import { copyFileSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, inject } from 'vitest';
import { closeDatabase } from '@/db/client';

/** Gives every test of the file its own copy of the migrated database. */
export function useFreshDatabase(): { file: () => string } {
  let folder = '';
  beforeEach(() => {
    closeDatabase();
    folder = mkdtempSync(path.join(tmpdir(), 'eavewright-test-'));
    process.env.DATABASE_FILE = path.join(folder, 'test.db');
    copyFileSync(inject('baseDatabase'), process.env.DATABASE_FILE);
  });
  afterEach(() => {
    closeDatabase();
    rmSync(folder, { recursive: true, force: true });
  });
  return { file: () => path.join(folder, 'test.db') };
}
