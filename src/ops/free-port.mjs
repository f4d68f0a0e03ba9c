import { createServer } from 'node:net';

function bind(port, host) {
  return new Promise((done, fail) => {
    const server = createServer();
    server.once('error', (error) => {
      if (['EADDRINUSE', 'EACCES'].includes(error.code)) done(undefined);
      else if (['EADDRNOTAVAIL', 'EAFNOSUPPORT'].includes(error.code))
        done(port); // a machine without IPv6
      else fail(error);
    });
    server.listen({ port, host, exclusive: true }, () => {
      const bound = server.address().port;
      server.close(() => done(bound));
    });
  });
}

/** Free on both loopback addresses: "localhost" may mean either. */
export async function isPortFree(port) {
  return (await bind(port, '127.0.0.1')) === port && (await bind(port, '::1')) === port;
}

/** The first free one of the preferred ports, else one that the system picks. */
export async function freePort(...preferred) {
  for (const port of preferred) if (port && (await isPortFree(port))) return port;
  return bind(0, '127.0.0.1');
}
