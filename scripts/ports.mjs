import { connect, createServer } from 'node:net';

/** A loopback port that is free now. */
export function freePort() {
  return listenOnce(0);
}

/** The first free loopback port from `preferred` upwards, at most twenty further. */
export async function freePortFrom(preferred) {
  for (let port = preferred; port < preferred + 20; port += 1) {
    const free = await listenOnce(port).catch(() => undefined);
    if (free) return free;
  }
  throw new Error(`The ports ${preferred} to ${preferred + 19} are all taken; free one of them or set PORT.`);
}

function listenOnce(port) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => {
      const { port: bound } = server.address();
      server.close(() => resolve(bound));
    });
  });
}

/** Whether something on this machine accepts connections on a loopback port. */
export function acceptsConnections(port) {
  return new Promise((resolve) => {
    const socket = connect({ port, host: '127.0.0.1' });
    socket.once('connect', () => resolve(true)).once('error', () => resolve(false));
    socket.once('connect', () => socket.destroy());
  });
}
