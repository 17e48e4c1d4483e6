import { join } from 'node:path';
import express, { type Express, type RequestHandler } from 'express';
import type { Sequelize } from 'sequelize';
import type { Environment } from './environment.ts';
import { answerErrors, unknownRoute } from './middlewares/answer-errors.ts';
import { limitReadings, limitSignIns } from './middlewares/limit-rate.ts';
import { explainBodyErrors, parseBody } from './middlewares/parse-body.ts';
import { refuseForeign } from './middlewares/place.ts';
import { secureHeaders } from './middlewares/secure-headers.ts';
import { serveClients } from './middlewares/serve-clients.ts';
import { createSessions } from './middlewares/sessions.ts';
import { createPassport, identify } from './middlewares/sign-in.ts';
import { initModels } from './models/index.ts';
import { healthRoutes } from './routes/health.ts';
import { routes } from './routes/index.ts';
import { mountRoute } from './routes/mount-route.ts';
import { createFileStore } from './services/files/file-store.ts';
import type { Logger } from './services/logger.ts';
import { createMailer } from './services/mailer.ts';
import type { Secrets } from './services/secrets.ts';
import type { Services } from './services/services.ts';

/** What the application is built from. */
export interface AppDeps {
  readonly sequelize: Sequelize;
  readonly databaseUrl: string;
  readonly environment: Environment;
  readonly secrets: Secrets;
  readonly logger: Logger;
  /** The built clients, or null when something else serves them (hot reload, tests of the API). */
  readonly clientsDir: string | null;
  /** The clock; tests set it. */
  readonly now?: () => Date;
}

/** The application, and how to close what it opened. */
export interface App {
  readonly handler: Express;
  readonly services: Services;
  readonly close: () => Promise<void>;
}

/** Builds the application: the API under `/api`, the desk at `/`, the terminal at `/kiosk`. */
export const createApp = (deps: AppDeps): App => {
  const { sequelize, databaseUrl, environment, secrets, logger, clientsDir, now = () => new Date() } = deps;
  const services: Services = {
    sequelize,
    models: initModels(sequelize),
    secrets,
    mailer: createMailer(environment.smtpUrl, logger),
    logger,
    files: createFileStore(join(environment.dataDir, 'files')),
    now,
  };
  const sessions = createSessions(databaseUrl, secrets.sessionSecret);
  const passport = createPassport(services);
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', 'loopback');
  app.set('query parser', 'simple');
  if (clientsDir !== null) app.use(secureHeaders());

  // Before sessions, which need the database whose health is asked for.
  for (const route of healthRoutes) mountRoute(app, services, route);
  app.use(
    '/api',
    refuseForeign,
    sessions.handler,
    passport.initialize(),
    passport.session() as RequestHandler,
  );
  app.use('/api', identify(services, passport));
  app.use(['/api/session/desk', '/api/session/terminal', '/api/terminals'], limitSignIns());
  app.use('/api/instrument-readings', limitReadings());
  app.use('/api', parseBody, explainBodyErrors);
  for (const route of routes) if (!healthRoutes.includes(route)) mountRoute(app, services, route);
  app.use('/api', unknownRoute);
  if (clientsDir !== null) app.use(serveClients(clientsDir));
  app.use(answerErrors(logger));
  return { handler: app, services, close: sessions.close };
};
