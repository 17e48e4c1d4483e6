import { readsTemperature } from '#shared/domain/instrument/instrument.ts';
import { furnaceRoles } from '#shared/domain/people/role.ts';
import type { Instrument } from '../models/instrument.ts';
import { isAny, isAtTerminal, type Actor } from './actor.ts';
import type { Policy } from './policy.ts';

const ownerAtDesk = (actor: Actor): boolean => actor.via === 'desk' && isAny(actor, 'owner');
const decides = (actor: Actor): boolean => isAny(actor, 'owner', 'caster');
const worksAtFurnace = (actor: Actor): boolean => isAtTerminal(actor) && isAny(actor, ...furnaceRoles);
const looksOn = (actor: Actor): boolean => (actor.via === 'desk' && decides(actor)) || worksAtFurnace(actor);

/** Who may enter instruments, check them and read what they say. */
export const instrumentPolicy = {
  list: { who: looksOn },
  read: { who: looksOn },
  create: { who: ownerAtDesk },
  revoke: { who: ownerAtDesk, when: (_actor: Actor, instrument: Instrument) => instrument.active },
  /** An apprentice reads by what a caster or the owner has checked. */
  check: {
    who: decides,
    when: (_actor: Actor, { active, kind }: Instrument) => active && readsTemperature(kind),
  },
} satisfies Record<string, Policy<Instrument>>;

/** Who may send readings: no person, but an instrument or a terminal, by its token. */
export const readingPolicy = {
  push: {
    who: ({ instrument, terminal }: Actor) => Boolean(instrument) || terminal !== null,
    refusal: 'token-refused',
  },
} satisfies Record<string, Policy>;

/** Who may log how flasks cool and hand in cooling curves, and see what came of it. */
export const coolingPolicy = {
  read: { who: looksOn },
  record: { who: looksOn },
} satisfies Record<string, Policy>;
