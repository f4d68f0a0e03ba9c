import { spawn, type ChildProcess } from 'node:child_process';
import { createServer } from 'node:net';
import { once } from 'node:events';
import { createWriteStream, mkdirSync } from 'node:fs';
import { join, resolve } from 'node:path';
import type { TestProject } from 'vitest/node';
import { migrate } from '@/src/ops/migrate';
import { databaseUrl, withAdmin } from '../api/template-database';

declare module 'vitest' {
  interface ProvidedContext {
    productUrl: string;
    productDatabaseUrl: string;
  }
}

const name = `chaffline_e2e_${process.pid}`;
const logs = resolve('.local', 'test');

/** The built product with a worker, on a database and a port of its own. */
export default async function setup(project: TestProject) {
  const adminUrl = process.env.DATABASE_URL;
  if (!adminUrl) throw new Error('DATABASE_URL is needed: run the tests with npm test -- <path>');
  await withAdmin(adminUrl, (admin) => admin.query(`create database ${name}`));
  const url = databaseUrl(adminUrl, name);
  await migrate(url);
  const port = await freePort();
  const env = {
    ...process.env,
    NODE_ENV: 'production' as const,
    DATABASE_URL: url,
    PUBLIC_URL: `http://localhost:${port}`,
    CHAFFLINE_SECRET: 'a secret for tests alone, of thirty-two characters and more',
    CHAFFLINE_DEMO: '1',
  };
  mkdirSync(logs, { recursive: true });
  const web = start('web', ['node_modules/next/dist/bin/next', 'start', '-H', '127.0.0.1', '-p', String(port)], env);
  const worker = start('worker', ['--import', 'tsx', 'src/worker/main.ts'], env);
  await untilReady(`http://localhost:${port}/health/ready`, web);
  project.provide('productUrl', `http://localhost:${port}`);
  project.provide('productDatabaseUrl', url);
  return async () => {
    await Promise.all([end(web), end(worker)]);
    await withAdmin(adminUrl, (admin) => admin.query(`drop database if exists ${name} with (force)`));
  };
}

function start(what: string, args: string[], env: NodeJS.ProcessEnv): ChildProcess {
  const child = spawn(process.execPath, args, { env, stdio: ['ignore', 'pipe', 'pipe'] });
  const log = createWriteStream(join(logs, `e2e-${what}.log`));
  child.stdout.pipe(log);
  child.stderr.pipe(log);
  return child;
}

async function end(child: ChildProcess): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return;
  const exited = once(child, 'exit');
  child.kill('SIGTERM');
  const timer = setTimeout(() => child.kill('SIGKILL'), 8000);
  await exited;
  clearTimeout(timer);
}

async function untilReady(url: string, web: ChildProcess): Promise<void> {
  const deadline = Date.now() + 60_000;
  while (Date.now() < deadline) {
    if (web.exitCode !== null) throw new Error(`the web process ended: see ${logs}/e2e-web.log`);
    const answer = await fetch(url).catch(() => undefined);
    if (answer?.ok) return;
    await new Promise((again) => setTimeout(again, 200));
  }
  throw new Error(`nothing answered at ${url}`);
}

async function freePort(): Promise<number> {
  const server = createServer();
  await new Promise<void>((listening) => server.listen(0, '127.0.0.1', listening));
  const { port } = server.address() as { port: number };
  await new Promise((closed) => server.close(closed));
  return port;
}
