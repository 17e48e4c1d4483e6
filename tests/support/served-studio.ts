import { mkdtemp, rm } from 'node:fs/promises';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { createApp } from '#server/app.ts';
import { readEnvironment } from '#server/environment.ts';
import { seedDemoStudio } from '#server/services/demo-studio/index.ts';
import type { Services } from '#server/services/services.ts';
import type { TestDatabase } from './template-database.ts';

const clientsDir = fileURLToPath(new URL('../../dist', import.meta.url));

/** The demo studio, served with the built clients on a port of its own. */
export interface ServedStudio {
  readonly origin: string;
  readonly services: Services;
  /** Moves the server's clock forward; terminals follow it. */
  readonly advance: (seconds: number) => void;
  /** Stops answering, as a dead server does; `resume` listens on the same port again. */
  readonly suspend: () => Promise<void>;
  readonly resume: () => Promise<void>;
  readonly close: () => Promise<void>;
}

const listen = (server: Server, port: number): Promise<number> =>
  new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => resolve((server.address() as AddressInfo).port));
  });

const stop = (server: Server): Promise<void> =>
  new Promise((resolve) => {
    server.close(() => resolve());
    server.closeAllConnections();
  });

/** Seeds the demo studio in a test's database and serves it. */
export const serveStudio = async (database: TestDatabase): Promise<ServedStudio> => {
  let aheadMs = 0;
  const dataDir = await mkdtemp(join(tmpdir(), 'ladlemark-files-'));
  const app = createApp({
    sequelize: database.sequelize,
    databaseUrl: database.url,
    environment: readEnvironment({ DATA_DIR: dataDir }),
    secrets: {
      sessionSecret: 'a secret of the tests, long enough',
      pinPepper: 'a pepper of the tests, long enough',
    },
    logger: {
      info: () => {},
      warn: () => {},
      error: (message, details) => void process.stderr.write(`${message} ${JSON.stringify(details)}\n`),
    },
    clientsDir,
    now: () => new Date(Date.now() + aheadMs),
  });
  await seedDemoStudio(app.services);
  let server = createServer(app.handler);
  const port = await listen(server, 0);
  return {
    origin: `http://localhost:${port}`,
    services: app.services,
    advance: (seconds) => {
      aheadMs += seconds * 1000;
    },
    suspend: () => stop(server),
    resume: async () => {
      server = createServer(app.handler);
      await listen(server, port);
    },
    close: async () => {
      await stop(server);
      await app.close();
      await rm(dataDir, { recursive: true });
    },
  };
};
