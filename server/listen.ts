import { createServer, type RequestListener, type Server } from 'node:http';

/** How long open requests and event streams may go on once the server has been told to stop, ms. */
const GOODBYE_MS = 3_000;

/** The server cannot take its address; the message is one sentence with the way out. */
export class ListenError extends Error {
  override readonly name = 'ListenError';
}

/**
 * Answers HTTP on an address.
 *
 * @throws ListenError when the port is taken or may not be used, or the host is not this machine's
 */
export function listen(handler: RequestListener, port: number, host: string): Promise<Server> {
  return new Promise((resolve, reject) => {
    const server = createServer(handler);
    server.once('error', (error: NodeJS.ErrnoException) => reject(new ListenError(sentence(error, port, host))));
    server.listen(port, host, () => resolve(server));
  });
}

/** Takes no new requests, lets those under way end, and cuts off what is still open after a few seconds. */
export function close(server: Server): Promise<void> {
  return new Promise((resolve) => {
    const cut = setTimeout(() => server.closeAllConnections(), GOODBYE_MS);
    server.close(() => {
      clearTimeout(cut);
      resolve();
    });
    server.closeIdleConnections();
  });
}

function sentence(error: NodeJS.ErrnoException, port: number, host: string): string {
  switch (error.code) {
    case 'EADDRINUSE':
      return `Port ${port} is taken by another program: stop that one, or choose another port as in "PORT=${port + 1} npm start".`;
    case 'EACCES':
      return `This user may not listen on port ${port}: choose one above 1023, as in "PORT=8080 npm start".`;
    case 'EADDRNOTAVAIL':
    case 'ENOTFOUND':
      return `HOST ${host} is not an address of this machine: give 127.0.0.1, or 0.0.0.0 for all of its networks.`;
    default:
      return `The server cannot listen on ${host}:${port} (${error.message}): set HOST and PORT to an address that can be used.`;
  }
}
