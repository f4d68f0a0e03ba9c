import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { expect, test } from 'vitest';
import { exclusively, tryLock } from '@/src/ops/exclusive.mjs';
import { waitUntil } from '@/src/ops/wait-until.mjs';

test('one holder at a time, in turn', async () => {
  const order: string[] = [];
  const hold = (name: string) =>
    exclusively('test-turns', async () => {
      order.push(`${name} in`);
      await new Promise((later) => setTimeout(later, 30));
      order.push(`${name} out`);
    });
  await Promise.all([hold('first'), hold('second')]);
  expect(order).toHaveLength(4);
  expect(order[0].split(' ')[0]).toBe(order[1].split(' ')[0]);
  expect(order[2].split(' ')[0]).toBe(order[3].split(' ')[0]);
});

test('a killed holder leaves no lock behind', async () => {
  const module = new URL('../../src/ops/exclusive.mjs', import.meta.url).href;
  const code = `const { tryLock } = await import('${module}'); await tryLock('test-killed'); console.log('held'); setInterval(() => {}, 1e6);`;
  const holder = spawn(process.execPath, ['--input-type=module', '-e', code], { stdio: ['ignore', 'pipe', 'inherit'] });
  await once(holder.stdout, 'data');
  expect(await tryLock('test-killed')).toBeUndefined();
  holder.kill('SIGKILL');
  const release = await waitUntil(() => tryLock('test-killed'), { withinMs: 5_000 });
  expect(release).toBeTypeOf('function');
  await release?.();
});
