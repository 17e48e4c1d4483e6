import { mkdtemp, rm } from 'node:fs/promises';
import { createServer } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Express } from 'express';
import request from 'supertest';
import { expect } from 'vitest';
import type { Role } from '#shared/domain/people/role.ts';
import type { Place } from '#server/middlewares/place.ts';
import type { Terminal } from '#server/models/terminal.ts';
import type { User } from '#server/models/user.ts';
import type { Services } from '#server/services/services.ts';
import { createApp } from '#server/app.ts';
import { readEnvironment } from '#server/environment.ts';
import { buildStudio } from '#tests/factories/build-studio.ts';
import { buildTerminal, type BuiltTerminal } from '#tests/factories/build-terminal.ts';
import { buildUser, PASSWORD, PIN } from '#tests/factories/build-user.ts';
import { createTestDatabase } from './test-database.ts';

/** A client of the API with a cookie jar and an address of its own. */
export type Client = ReturnType<typeof request.agent>;

/** Someone who has signed in, and the client they did it with. */
export interface SignedInClient {
  readonly user: User;
  readonly client: Client;
}

/** Someone signed in at a terminal. */
export interface TerminalClient extends SignedInClient {
  readonly terminal: Terminal;
  readonly token: string;
}

/** The application on a database of its own, with a clock that stands still until a test moves it. */
export interface TestServer {
  readonly origin: string;
  readonly handler: Express;
  readonly services: Services;
  /** Moves the clock on. */
  readonly advance: (seconds: number) => void;
  /** A client that nobody has signed in with. */
  readonly nobody: (place?: Place) => Client;
  /** A client of an enrolled device at which nobody has signed in. */
  readonly atTerminal: (token: string) => Client;
  /** Signs someone in at the desk: a given person, or a new one of that role. */
  readonly deskAs: (who: Role | User) => Promise<SignedInClient>;
  /** Signs someone in by PIN, at a given terminal or a new one. */
  readonly terminalAs: (who: Role | User, at?: BuiltTerminal) => Promise<TerminalClient>;
  /** Fails when the server met an error that nobody foresaw; forgets what it looked at. */
  readonly expectNoSurprises: () => void;
  readonly close: () => Promise<void>;
}

/** When every test begins, unless it moves the clock. */
export const START = '2026-12-01T10:00:00.000Z';

const secrets = {
  sessionSecret: 'a secret of the tests, long enough',
  pinPepper: 'a pepper of the tests, long enough',
};

/** Starts the application with a studio and nobody in it. */
export const startTestServer = async (): Promise<TestServer> => {
  const database = await createTestDatabase();
  const dataDir = await mkdtemp(join(tmpdir(), 'ladlemark-files-'));
  const errors: unknown[] = [];
  let clock = Date.parse(START);
  const app = createApp({
    sequelize: database.sequelize,
    databaseUrl: database.url,
    environment: readEnvironment({ DATA_DIR: dataDir }),
    secrets,
    logger: {
      info: () => {},
      warn: () => {},
      error: (message, details) => errors.push({ message, details }),
    },
    clientsDir: null,
    now: () => new Date(clock),
  });
  const { services } = app;
  await buildStudio(services);
  const server = createServer(app.handler);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as { port: number };

  let clients = 0;
  const nobody = (place: Place = 'desk'): Client => {
    clients += 1;
    // Sign-ins are counted for each address, so every client has one.
    const address = `10.0.${clients >> 8}.${clients & 255}`;
    return request.agent(server).set('Ladlemark-Place', place).set('X-Forwarded-For', address);
  };
  const atTerminal = (token: string): Client => {
    const client = nobody('terminal');
    client.jar.setCookie(`ladlemark-token=${token}`, '127.0.0.1', '/');
    return client;
  };
  const asUser = (who: Role | User): Promise<User> | User =>
    typeof who === 'string' ? buildUser(services, { roles: [who] }) : who;

  const deskAs = async (who: Role | User): Promise<SignedInClient> => {
    const user = await asUser(who);
    const client = nobody();
    await client.post('/api/session/desk').send({ login: user.login, password: PASSWORD }).expect(200);
    return { user, client };
  };
  const terminalAs = async (who: Role | User, at?: BuiltTerminal): Promise<TerminalClient> => {
    const user = await asUser(who);
    const built = at ?? (await buildTerminal(services));
    const client = atTerminal(built.token);
    await client.post('/api/session/terminal').send({ personId: user.id, pin: PIN }).expect(200);
    return { ...built, user, client };
  };

  return {
    handler: app.handler,
    origin: `http://127.0.0.1:${port}`,
    services,
    advance: (seconds) => {
      clock += seconds * 1000;
    },
    nobody,
    atTerminal,
    deskAs,
    terminalAs,
    expectNoSurprises: () => expect(errors.splice(0)).toEqual([]),
    close: async () => {
      await new Promise<void>((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      });
      await app.close();
      await database.drop();
      await rm(dataDir, { recursive: true });
    },
  };
};
