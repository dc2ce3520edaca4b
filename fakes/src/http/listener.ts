import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import type { AddressInfo, Socket } from 'node:net';

export type Handle = (request: IncomingMessage, response: ServerResponse) => Promise<void>;

export type Listener = {
  readonly port: number;
  readonly address: string;
  close(): Promise<void>;
};

/**
 * Starts an HTTP server on the loopback interface.
 *
 * @param port the port; 0 takes any free one
 * @param handle answers a request; what it throws is answered as a plain 500
 * @returns the listener; `close` also ends connections that are still open
 */
export async function listen(port: number, handle: Handle): Promise<Listener> {
  const sockets = new Set<Socket>();
  const server = createServer((request, response) => {
    handle(request, response).catch((fault: unknown) => answerFault(response, fault));
  });
  server.on('connection', (socket) => {
    sockets.add(socket);
    socket.on('close', () => sockets.delete(socket));
  });
  await started(server, port);
  const bound = (server.address() as AddressInfo).port;
  return {
    port: bound,
    address: `http://127.0.0.1:${bound}`,
    close: () => stop(server, sockets),
  };
}

function started(server: Server, port: number): Promise<void> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => {
      server.removeListener('error', reject);
      resolve();
    });
  });
}

function stop(server: Server, sockets: ReadonlySet<Socket>): Promise<void> {
  return new Promise((resolve) => {
    server.close(() => resolve());
    // A request that was told to hang would otherwise keep the server open for ever.
    for (const socket of sockets) socket.destroy();
  });
}

function answerFault(response: ServerResponse, fault: unknown): void {
  if (response.headersSent) {
    response.destroy();
    return;
  }
  response.writeHead(500, { 'content-type': 'text/plain; charset=utf-8' });
  response.end(`The stand-in failed: ${fault instanceof Error ? (fault.stack ?? fault.message) : String(fault)}\n`);
}
