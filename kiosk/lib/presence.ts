import { createContext, use } from 'react';
import type { Session } from '#shared/contracts/session.ts';
import type { Role } from '#shared/domain/people/role.ts';

/** Who stands at this terminal, and whose studio it is. */
export interface Presence {
  readonly person: NonNullable<Session['person']>;
  readonly terminal: NonNullable<Session['terminal']>;
  readonly studio: Session['studio'];
  /** Signs out; does nothing while records wait for delivery, because they are delivered in this person's name. */
  readonly signOut: () => void;
}

/** Carries the person signed in to the screens below. */
export const PresenceContext = createContext<Presence | null>(null);

/** The person signed in, on screens that are only drawn for one. */
export const usePresence = (): Presence => {
  const presence = use(PresenceContext);
  if (!presence) throw new Error('This screen needs a person signed in.');
  return presence;
};

const deciding: readonly Role[] = ['owner', 'caster'];

/** Whether a person decides what an apprentice may not: to end a card, to stand by a doubtful reading. */
export const mayDecide = ({ roles }: Pick<Presence['person'], 'roles'>): boolean =>
  roles.some((role) => deciding.includes(role));

/** A person's first name, for buttons and tiles. */
export const firstName = (name: string): string => name.split(' ')[0] ?? name;
