import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { StartProblem } from '#server/services/start-problem.ts';

const FINISH_WITHIN_MS = 5_000;
const IDLE_SWEEP_MS = 50;

const sentenceFor = (code: string | undefined, port: number, host: string): string | null => {
  switch (code) {
    case 'EADDRINUSE':
      return `Port ${port} is taken by another program, or Ladlemark runs already. Choose another: PORT=${port + 1} npm start`;
    case 'EACCES':
      return `This user may not use port ${port}. Choose one above 1023: PORT=4380 npm start`;
    case 'EADDRNOTAVAIL':
    case 'ENOTFOUND':
    case 'EAI_AGAIN':
      return `HOST is ${host}, which is not an address of this machine. Use 127.0.0.1 for this machine only, or 0.0.0.0 for its network.`;
    default:
      return null;
  }
};

/**
 * Starts listening and gives the port, which the system chooses when 0 is asked for.
 * @throws {StartProblem} when the port or the host cannot be had.
 */
export const listen = (server: Server, port: number, host: string): Promise<number> =>
  new Promise((resolve, reject) => {
    server.once('error', (error: NodeJS.ErrnoException) => {
      const sentence = sentenceFor(error.code, port, host);
      reject(sentence === null ? error : new StartProblem(sentence));
    });
    server.listen(port, host, () => resolve((server.address() as AddressInfo).port));
  });

/** Stops accepting, lets requests finish for a while, and cuts what is open then. */
export const closeServer = async (server: Server, finishWithinMs = FINISH_WITHIN_MS): Promise<void> => {
  const closed = new Promise<void>((resolve) => server.close(() => resolve()));
  // A browser keeps its connection after the last answer; each is closed as soon as it has nothing to do.
  const sweep = setInterval(() => server.closeIdleConnections(), IDLE_SWEEP_MS);
  const limit = setTimeout(() => server.closeAllConnections(), finishWithinMs);
  server.closeIdleConnections();
  await closed;
  clearInterval(sweep);
  clearTimeout(limit);
};

/** Tries the port before the long steps of a start, so that a taken one is told at once. */
export const tryPort = async (port: number, host: string): Promise<void> => {
  const probe = createServer();
  await listen(probe, port, host);
  await closeServer(probe);
};
