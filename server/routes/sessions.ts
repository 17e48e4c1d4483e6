import { pinSignInRequest, signInRequest } from '#shared/contracts/session.ts';
import { sessionPolicy } from '../policies/session.ts';
import { loadStudio } from '../queries/load-studio.ts';
import { presentSession } from '../presenters/session.ts';
import { actorOf, signIn, signOut } from '../middlewares/sign-in.ts';
import { defineRoute } from './define-route.ts';

const readSession = defineRoute({
  method: 'get',
  path: '/api/session',
  policy: sessionPolicy.use,
  act: async ({ actor, services }) => presentSession(actor, await loadStudio(services), services.now()),
});

const signInAtDesk = defineRoute({
  method: 'post',
  path: '/api/session/desk',
  policy: sessionPolicy.use,
  body: signInRequest,
  act: async ({ services, body, http }) => {
    await signIn('password', http, body);
    return presentSession(actorOf(http), await loadStudio(services), services.now());
  },
});

const signInAtTerminal = defineRoute({
  method: 'post',
  path: '/api/session/terminal',
  policy: sessionPolicy.usePin,
  body: pinSignInRequest,
  act: async ({ services, body, http }) => {
    await signIn('pin', http, body);
    return presentSession(actorOf(http), await loadStudio(services), services.now());
  },
});

const endSession = defineRoute({
  method: 'post',
  path: '/api/session/end',
  policy: sessionPolicy.use,
  act: async ({ http }) => {
    await signOut(http);
    return null;
  },
});

export const sessionRoutes = [readSession, signInAtDesk, signInAtTerminal, endSession];
