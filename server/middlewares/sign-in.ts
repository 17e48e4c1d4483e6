import type { Request, RequestHandler } from 'express';
import { Passport } from 'passport';
import { Strategy } from 'passport-local';
import { signInWithPassword } from '../commands/sign-in-with-password.ts';
import { signInWithPin } from '../commands/sign-in-with-pin.ts';
import { AppError } from '../errors.ts';
import type { Instrument } from '../models/instrument.ts';
import type { Terminal } from '../models/terminal.ts';
import type { User as StudioUser } from '../models/user.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { bearerOf } from './bearer-token.ts';
import type { Http } from './http.ts';
import { placeOf, type Place } from './place.ts';
import { terminalOf } from './terminal-token.ts';

type PassportInstance = InstanceType<typeof Passport>;

declare global {
  // eslint-disable-next-line @typescript-eslint/no-namespace -- passport's types are extended by merging this namespace.
  namespace Express {
    interface User {
      readonly id: string;
      readonly name: string;
      readonly roles: StudioUser['roles'];
    }
    interface Locals {
      actor: Actor;
      terminal: Terminal | null;
      instrument: Instrument | null;
      passport: PassportInstance;
    }
  }
}

const asUser = ({ id, name, roles }: StudioUser): Express.User => ({ id, name, roles });

/** Passport with its two ways in: name and password at the desk, person and PIN at a terminal. */
export const createPassport = (services: Services): PassportInstance => {
  const passport = new Passport();
  passport.use(
    'password',
    new Strategy({ usernameField: 'login', passwordField: 'password' }, (login, password, done) => {
      signInWithPassword(services, { login, password }).then((user) => done(null, asUser(user)), done);
    }),
  );
  passport.use(
    'pin',
    new Strategy({ usernameField: 'personId', passwordField: 'pin' }, (personId, pin, done) => {
      signInWithPin(services, { personId, pin }).then((user) => done(null, asUser(user)), done);
    }),
  );
  passport.serializeUser(({ id }, done) => done(null, id));
  passport.deserializeUser((id: string, done) => {
    services.models.User.findOne({ where: { id, active: true } }).then(
      (user) => done(null, user ? asUser(user) : false),
      done,
    );
  });
  return passport;
};

/** Whether a session was opened where it is used: in the same application, and a terminal's at that very terminal. */
const isSessionHere = ({ session }: Request, place: Place, terminal: Terminal | null): boolean =>
  session.place === place && (place === 'desk' || (terminal !== null && session.terminalId === terminal.id));

/** Who is asking, with what they hold here. */
const readActor = ({ request, response }: Http): Actor => {
  const { terminal, instrument } = response.locals;
  const place = placeOf(request);
  const person = request.user && isSessionHere(request, place, terminal) ? request.user : null;
  return {
    person,
    terminal: terminal && { id: terminal.id, name: terminal.name, bay: terminal.bay },
    instrument: instrument && { id: instrument.id, name: instrument.name },
    via: person ? place : null,
  };
};

/** Finds out who is asking and keeps it for the route. */
export const identify =
  (services: Services, passport: PassportInstance): RequestHandler =>
  async (request, response, next) => {
    const bearer = await bearerOf(request, services);
    response.locals.instrument = bearer.instrument;
    response.locals.terminal = bearer.terminal ?? (await terminalOf(request, services));
    response.locals.passport = passport;
    response.locals.actor = readActor({ request, response });
    next();
  };

/** The actor as it stands after a sign-in or sign-out within this request. */
export const actorOf = (http: Http): Actor => readActor(http);

const asError = (error: unknown): Error =>
  error instanceof Error ? error : new Error('Passport failed and gave no reason.');

const authenticate = ({ request, response }: Http, strategy: 'password' | 'pin'): Promise<Express.User> =>
  new Promise((resolve, reject) => {
    const done = (error: unknown, user?: Express.User | false): void => {
      if (user) resolve(user);
      else reject(asError(error));
    };
    const { passport } = response.locals;
    (passport.authenticate(strategy, done) as RequestHandler)(request, response, reject);
  });

/** Where each way of signing in belongs. */
const places = { password: 'desk', pin: 'terminal' } as const;

/** Signs in by one of the two ways; the session is renewed, so that one fixed beforehand is worth nothing. */
export const signIn = async (
  strategy: 'password' | 'pin',
  http: Http,
  credentials: object,
): Promise<void> => {
  const { request, response } = http;
  const place = places[strategy];
  if (placeOf(request) !== place) {
    throw new AppError('invalid-request', 'Passwords are for the desk, PINs for a terminal.');
  }
  // Passport's strategies read the body themselves; they get it as it was validated.
  request.body = credentials;
  const user = await authenticate(http, strategy);
  await new Promise<void>((resolve, reject) => {
    request.logIn(user, (error?: unknown) => (error ? reject(asError(error)) : resolve()));
  });
  request.session.place = place;
  if (strategy === 'pin') request.session.terminalId = response.locals.terminal?.id;
};

/** Signs out and drops the session. */
export const signOut = ({ request }: Http): Promise<void> =>
  new Promise((resolve, reject) => {
    request.logOut((error?: unknown) => {
      if (error) return reject(asError(error));
      request.session.destroy((failure?: unknown) => (failure ? reject(asError(failure)) : resolve()));
    });
  });
