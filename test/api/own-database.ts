import { randomBytes } from 'node:crypto';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { afterAll, beforeAll, inject } from 'vitest';
import { closeOrm } from '@/src/db';
import { closeThreads } from '@/src/runs/curve-threads';
import { closeLimits } from '@/src/web/rate-limit';
import { databaseUrl, withAdmin } from './template-database';

/** A database of this file's own, copied from the template; everything of the product in this process uses it. */
export function withOwnDatabase(): void {
  const name = `chaffline_test_${randomBytes(6).toString('hex')}`;
  beforeAll(async () => {
    const adminUrl = inject('adminUrl');
    await withAdmin(adminUrl, (admin) => admin.query(`create database ${name} template ${inject('templateName')}`));
    process.env.DATABASE_URL = databaseUrl(adminUrl, name);
    process.env.CHAFFLINE_STATE_DIR = resolve('.local');
    process.env.LOG_LEVEL = 'silent';
  });
  afterAll(async () => {
    await closeThreads();
    await closeLimits();
    await closeOrm();
    await withAdmin(inject('adminUrl'), (admin) => admin.query(`drop database if exists ${name} with (force)`));
  });
}

/** A folder of this test's own. */
export function temporaryFolder(): { path: string; remove(): void } {
  const path = mkdtempSync(join(tmpdir(), 'chaffline-'));
  return { path, remove: () => rmSync(path, { recursive: true, force: true }) };
}
