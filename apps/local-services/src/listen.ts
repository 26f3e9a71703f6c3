import { createServer, type Server, type RequestListener } from 'node:http';
import type { AddressInfo } from 'node:net';

/** A web server that listens on 127.0.0.1, with the port it really got. */
export interface Listening {
  readonly port: number;
  readonly server: Server;
  close(): Promise<void>;
}

/** Starts an HTTP server on 127.0.0.1. @throws the system's error, e.g. EADDRINUSE, when the port is taken. */
export const listen = async (app: RequestListener, port: number): Promise<Listening> => {
  const server = createServer(app);
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', resolve);
  });
  return {
    server,
    port: (server.address() as AddressInfo).port,
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      }),
  };
};
