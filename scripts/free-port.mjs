import { createServer } from 'node:net';

function listen(port, host) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(undefined));
    server.listen({ port, host, exclusive: true }, () => {
      const taken = server.address().port;
      server.close(() => resolve(taken));
    });
  });
}

/** A port that nothing listens on, chosen by the system. */
export const anyFreePort = () => listen(0, '127.0.0.1');

/** The first port from `from` on that is free on the host. */
export async function firstFreePort(from, host) {
  for (let port = from; port < from + 200; port += 1) {
    if (await listen(port, host)) return port;
  }
  throw new Error(`No free port between ${from} and ${from + 200} on ${host}.`);
}
