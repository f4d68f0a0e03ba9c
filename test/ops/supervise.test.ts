import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { isAlive } from '@/src/ops/living-process.mjs';
import { supervise } from '@/src/ops/supervise.mjs';
import { waitUntil } from '@/src/ops/wait-until.mjs';

let dir: string;
let sleeper: string;

beforeEach(() => {
  dir = mkdtempSync(join(tmpdir(), 'chaffline-supervise-'));
  sleeper = join(dir, 'sleeper.mjs');
  writeFileSync(sleeper, 'setInterval(() => {}, 1e6);');
});

afterEach(() => rmSync(dir, { recursive: true }));

test('a killed process is started again, a stopped one is not', async () => {
  const kept = supervise({ name: 'sleeper', args: [sleeper], out: 'ignore' });
  const firstPid = kept.pid!;
  process.kill(firstPid, 'SIGKILL');
  const secondPid = await waitUntil(() => kept.pid !== firstPid && kept.pid, { withinMs: 5_000 });
  expect(isAlive(secondPid as number)).toBe(true);
  await kept.stop();
  expect(isAlive(secondPid as number)).toBe(false);
  expect(kept.deaths).toBe(2);
});

test('processes do not outlive a supervisor that was killed', async () => {
  const supervisor = join(dir, 'supervisor.mjs');
  const module = new URL('../../src/ops/supervise.mjs', import.meta.url).href;
  writeFileSync(
    supervisor,
    `import { supervise } from '${module}';
     const kept = supervise({ name: 'sleeper', args: ['${sleeper}'], out: 'ignore' });
     setTimeout(() => console.log(kept.pid), 500);`,
  );
  const parent = spawn(process.execPath, [supervisor], { stdio: ['ignore', 'pipe', 'inherit'] });
  const [printed] = (await once(parent.stdout, 'data')) as [Buffer];
  const childPid = Number(printed.toString());
  expect(isAlive(childPid)).toBe(true);
  parent.kill('SIGKILL');
  expect(await waitUntil(() => !isAlive(childPid), { withinMs: 10_000 })).toBe(true);
});
