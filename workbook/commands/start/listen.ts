/** Finds a free port on the loopback address and nowhere else. */
import type { Server } from 'node:http';

const firstPort = 8642;
const portsTried = 50;
const loopback = '127.0.0.1';

/** @returns the port the server listens on, or why there is none, in words */
export async function listen(server: Server, asked: number | null): Promise<number | string> {
  const ports =
    asked === null ? Array.from({ length: portsTried }, (_, place) => firstPort + place) : [asked];
  for (const port of ports) {
    const outcome = await tryPort(server, port);
    if (typeof outcome === 'number') return outcome;
    if (outcome === 'EACCES' && asked !== null)
      return `port ${port} needs rights that you do not have: choose one above 1023`;
    if (outcome !== 'EADDRINUSE' && outcome !== 'EACCES')
      return `no port on ${loopback} can be used (${outcome})`;
  }
  return asked === null
    ? `ports ${firstPort} to ${firstPort + portsTried - 1} are all in use: name a free one with --port`
    : `port ${asked} is in use: name another, or leave --port out`;
}

/** @returns the port, which 0 leaves to the system, or the system's code for why not */
function tryPort(server: Server, port: number): Promise<number | string> {
  return new Promise((resolve) => {
    const failed = (error: NodeJS.ErrnoException): void => resolve(error.code ?? error.message);
    server.once('error', failed);
    server.listen({ port, host: loopback, exclusive: true }, () => {
      server.removeListener('error', failed);
      const address = server.address();
      resolve(typeof address === 'object' && address ? address.port : port);
    });
  });
}
