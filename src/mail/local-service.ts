import { once } from 'node:events';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';

/** Stands in for the mail service where no key is given: takes every message on loopback and delivers none. */
export async function startLocalService(): Promise<string> {
  const server = createServer((request, response) => {
    request.resume();
    request.once('end', () => {
      response.writeHead(200, { 'content-type': 'application/json' });
      response.end(JSON.stringify({ id: request.headers['idempotency-key'] ?? 'local' }));
    });
  });
  server.listen(0, '127.0.0.1');
  server.unref();
  await once(server, 'listening');
  return `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
}
