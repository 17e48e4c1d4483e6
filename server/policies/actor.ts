import type { Role } from '#shared/domain/people/role.ts';

/** Who is asking: the person signed in, the terminal the request comes from, and by which door they came in. */
export interface Actor {
  readonly person: { readonly id: string; readonly name: string; readonly roles: readonly Role[] } | null;
  readonly terminal: { readonly id: string; readonly name: string; readonly bay: string } | null;
  /** An instrument that sends by itself, known by its token. */
  readonly instrument?: { readonly id: string; readonly name: string } | null;
  readonly via: 'desk' | 'terminal' | null;
}

/** An actor known to be a person. */
export type SignedIn = Actor & { readonly person: NonNullable<Actor['person']> };

/** An actor known to be a person standing at a terminal. */
export type AtTerminal = SignedIn & { readonly terminal: NonNullable<Actor['terminal']> };

/** Whether the actor is a person who holds one of these roles. */
export const isAny = ({ person }: Actor, ...roles: readonly Role[]): boolean =>
  person !== null && roles.some((role) => person.roles.includes(role));

/** Whether the actor is a person. */
export const isSignedIn = (actor: Actor): actor is SignedIn => actor.person !== null;

/** Whether the actor is a person signed in at an enrolled terminal. */
export const isAtTerminal = (actor: Actor): actor is AtTerminal =>
  actor.person !== null && actor.terminal !== null && actor.via === 'terminal';
