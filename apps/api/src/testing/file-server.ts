import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';

/** Answers one request. */
export type Answer = (request: IncomingMessage, response: ServerResponse) => void;

/** A web server on the loopback address for tests, whose answer is set from one test to the next. */
export interface FileServer {
  readonly origin: string;
  readonly host: string;
  /** The requests that came, the newest last. */
  readonly requests: IncomingMessage[];
  answer: Answer;
  close(): Promise<void>;
}

/** Starts a web server that answers 404 until it is told otherwise. */
export async function startFileServer(): Promise<FileServer> {
  const requests: IncomingMessage[] = [];
  const server: Server = createServer((request, response) => {
    requests.push(request);
    told.answer(request, response);
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const host = `127.0.0.1:${(server.address() as AddressInfo).port}`;
  const told: FileServer = {
    ...{ host, origin: `http://${host}`, requests },
    answer: (_, response) => void response.writeHead(404).end(),
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      }),
  };
  return told;
}

/** Answers with a body. */
export const body =
  (content: string | Buffer, headers: Record<string, string> = {}, status = 200): Answer =>
  (_, response) =>
    void response.writeHead(status, { 'content-type': 'text/csv', ...headers }).end(content);
