import { createServer, type AddressInfo, type Server } from 'node:net';
import { afterEach, expect, test } from 'vitest';
import { freePort } from '@/src/ops/free-port.mjs';
import { webPort } from '@/src/ops/web-port.mjs';

const open: Server[] = [];

async function occupy(host: string): Promise<number> {
  const server = createServer();
  open.push(server);
  await new Promise<void>((listening) => server.listen(0, host, listening));
  return (server.address() as AddressInfo).port;
}

afterEach(async () => {
  await Promise.all(open.splice(0).map((server) => new Promise((closed) => server.close(closed))));
});

test('a taken port is passed over for the next preferred one', async () => {
  const taken = await occupy('127.0.0.1');
  const free = await occupy('127.0.0.1');
  await new Promise((closed) => open.pop()!.close(closed));
  expect(await freePort(taken, free)).toBe(free);
});

test('without a free preferred port the system picks one that can be listened on', async () => {
  const taken = await occupy('127.0.0.1');
  const port = await freePort(taken);
  expect(port).not.toBe(taken);
  const server = createServer();
  open.push(server);
  await new Promise<void>((listening) => server.listen(port, '127.0.0.1', listening));
});

test('a port asked for by name is never replaced by another one', async () => {
  const taken = await occupy('127.0.0.1');
  await expect(webPort(String(taken))).rejects.toThrow(`Port ${taken} is taken`);
  await expect(webPort('many')).rejects.toThrow('not a port number');
});
