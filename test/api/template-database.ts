import pg from 'pg';
import type { TestProject } from 'vitest/node';
import { migrate } from '@/src/ops/migrate';

declare module 'vitest' {
  interface ProvidedContext {
    adminUrl: string;
    templateName: string;
  }
}

/** One migrated database that every test file copies. */
export default async function setup(project: TestProject) {
  const adminUrl = process.env.DATABASE_URL;
  if (!adminUrl) throw new Error('DATABASE_URL is needed: run the tests with npm test -- <path>');
  const templateName = `chaffline_template_${process.pid}`;
  await withAdmin(adminUrl, async (admin) => {
    await admin.query(`drop database if exists ${templateName} with (force)`);
    await admin.query(`create database ${templateName}`);
  });
  await migrate(databaseUrl(adminUrl, templateName));
  project.provide('adminUrl', adminUrl);
  project.provide('templateName', templateName);
  return () => withAdmin(adminUrl, (admin) => admin.query(`drop database if exists ${templateName} with (force)`));
}

export function databaseUrl(adminUrl: string, name: string): string {
  const url = new URL(adminUrl);
  url.pathname = `/${name}`;
  return url.href;
}

export async function withAdmin<T>(adminUrl: string, work: (admin: pg.Client) => Promise<T>): Promise<T> {
  const admin = new pg.Client({ connectionString: adminUrl });
  await admin.connect();
  try {
    return await work(admin);
  } finally {
    await admin.end();
  }
}
