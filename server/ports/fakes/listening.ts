import type { AddressInfo, Server, Socket } from 'node:net';

/** Only this machine reaches a fake. */
export const LOOPBACK = '127.0.0.1';

/** Listens on loopback; port 0 takes any free one. Resolves to the port, rejects when it is taken. */
export function listenOnLoopback(server: Server, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, LOOPBACK, () => {
      server.off('error', reject);
      resolve((server.address() as AddressInfo).port);
    });
  });
}

/** Keeps the open sockets, so that a fake can drop one in the middle and stop at once. */
export function trackSockets(server: Server): { dropAll(): void; drop(remotePort: number): void } {
  const sockets = new Set<Socket>();
  server.on('connection', (socket: Socket) => {
    sockets.add(socket);
    socket.on('close', () => sockets.delete(socket));
  });
  return {
    dropAll() {
      for (const socket of sockets) socket.destroy();
    },
    drop(remotePort) {
      for (const socket of sockets) if (socket.remotePort === remotePort) socket.destroy();
    },
  };
}
