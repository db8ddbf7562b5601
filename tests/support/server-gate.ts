import { connect, createServer, type AddressInfo, type Socket } from 'node:net';

/** A door between the server and PostgreSQL: shut, it cuts every connection and lets none in. */
export interface Gate {
  url: string;
  shut: () => Promise<void>;
  open: () => Promise<void>;
}

/** Opens a door on a port of its own in front of the database of this URL. */
export async function openGate(databaseUrl: string): Promise<Gate> {
  const target = new URL(databaseUrl);
  const sockets = new Set<Socket>();
  const server = createServer((near) => {
    const far = connect(Number(target.port), target.hostname);
    for (const socket of [near, far]) {
      sockets.add(socket);
      socket.on('close', () => sockets.delete(socket));
      socket.on('error', () => [near, far].forEach((one) => one.destroy()));
      socket.on('end', () => [near, far].forEach((one) => one.destroy()));
    }
    near.pipe(far).pipe(near);
  });
  const listen = (port: number): Promise<void> =>
    new Promise((resolve) => server.listen(port, '127.0.0.1', () => resolve()));
  await listen(0);
  const { port } = server.address() as AddressInfo;
  return {
    url: Object.assign(new URL(databaseUrl), { hostname: '127.0.0.1', port: String(port) }).href,
    shut: () =>
      new Promise((resolve) => {
        server.close(() => resolve());
        for (const socket of sockets) socket.destroy();
      }),
    open: () => listen(port),
  };
}
