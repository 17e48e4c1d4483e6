import { createServer } from 'node:http';
import { fileURLToPath } from 'node:url';
import { createApp } from './app.ts';
import { bannerLines } from './cli/start/banner.ts';
import { createDevClients } from './cli/start/dev-clients.ts';
import { closeServer, listen, tryPort } from './cli/start/listen.ts';
import { createStopper } from './cli/start/stopper.ts';
import { readEnvironment } from './environment.ts';
import { createDatabase } from './models/database.ts';
import { ensureClients } from './services/clients-build.ts';
import { readDemoAccess, seedDemoStudio } from './services/demo-studio/index.ts';
import { createLogger } from './services/logger.ts';
import { migrate } from './services/migrator.ts';
import { prepareDatabase } from './services/prepare-database.ts';
import { sayOnStdout as say } from './services/say.ts';
import { loadSecrets } from './services/secrets.ts';

const root = fileURLToPath(new URL('..', import.meta.url));
const isDev = process.argv.includes('--dev');

const stopper = createStopper(say);

/** Brings everything up in order; each step says what it does when it takes long, and is undone at the end. */
const start = async (): Promise<void> => {
  const { step, onStop } = stopper;
  const environment = readEnvironment(process.env);
  await tryPort(environment.port, environment.host);
  const secrets = await step(() => loadSecrets(environment));

  const database = await prepareDatabase(environment, say);
  onStop(database.release);
  const sequelize = createDatabase(database.url);
  onStop(() => sequelize.close());
  await step(() => migrate(sequelize));

  const clientsDir = isDev ? null : await step(() => ensureClients(root, say, stopper.signal));
  const logger = createLogger((line) => process.stderr.write(line));
  const app = createApp({ sequelize, databaseUrl: database.url, environment, secrets, logger, clientsDir });
  onStop(app.close);
  await step(() => seedDemoStudio(app.services));

  const server = createServer();
  const clients = isDev ? await createDevClients(server, app.handler) : null;
  server.on('request', clients?.handler ?? app.handler);
  if (clients) onStop(clients.close);
  onStop(() => closeServer(server));
  const port = await step(() => listen(server, environment.port, environment.host));

  const demo = await step(() => readDemoAccess(app.services));
  for (const line of bannerLines(environment.host, port, demo)) say(line);
  stopper.started();
};

// A closed terminal must not turn a farewell line into a crash.
process.stdout.on('error', () => {});

await start().catch(stopper.fail);
