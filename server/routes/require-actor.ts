import { AppError } from '../errors.ts';
import { isAtTerminal, isSignedIn, type Actor, type AtTerminal, type SignedIn } from '../policies/actor.ts';

/** The actor as a person; the route's policy has seen to it, this tells the compiler. */
export const requirePerson = (actor: Actor): SignedIn => {
  if (!isSignedIn(actor)) throw new AppError('not-signed-in', 'Sign in first.');
  return actor;
};

/** The actor as a person at a terminal; the route's policy has seen to it, this tells the compiler. */
export const requireAtTerminal = (actor: Actor): AtTerminal => {
  if (!isAtTerminal(actor))
    throw new AppError('terminal-not-enrolled', 'This is done at an enrolled terminal.');
  return actor;
};
