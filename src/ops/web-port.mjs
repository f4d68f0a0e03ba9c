import { Failure } from './failure.mjs';
import { freePort, isPortFree } from './free-port.mjs';
import { say } from './say.mjs';

const preferredPort = 4180;

/** A port that was asked for is taken or refused; without a wish another one will do. */
export async function webPort(asked = process.env.PORT) {
  if (!asked) {
    const port = await freePort(preferredPort);
    if (port !== preferredPort) say(`Port ${preferredPort} is taken: using ${port}`);
    return port;
  }
  const port = Number(asked);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) throw new Failure(`PORT=${asked} is not a port number.`);
  if (!(await isPortFree(port))) throw new Failure(`Port ${port} is taken by another program: choose another PORT.`);
  return port;
}
