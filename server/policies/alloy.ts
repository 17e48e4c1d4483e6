import type { AlloyRevision } from '../models/alloy-revision.ts';
import { isAny, isSignedIn, type Actor } from './actor.ts';
import type { Policy } from './policy.ts';

const ownerAtDesk = (actor: Actor): boolean => actor.via === 'desk' && isAny(actor, 'owner');

/** Who may see, draft, check and approve alloys. */
export const alloyPolicy = {
  list: { who: isSignedIn },
  read: { who: isSignedIn },
  create: { who: ownerAtDesk },
  revise: { who: ownerAtDesk },
} satisfies Record<string, Policy>;

/** Who may take a revision of an alloy forward. */
export const alloyRevisionPolicy = {
  /** Whoever knows the furnace may check the figures of a draft. */
  check: {
    who: (actor: Actor) => actor.via === 'desk' && isAny(actor, 'owner', 'caster'),
    when: (_actor: Actor, revision: AlloyRevision) => revision.status === 'draft',
  },
  approve: {
    who: ownerAtDesk,
    when: (_actor: Actor, revision: AlloyRevision) => revision.status === 'checked',
  },
} satisfies Record<string, Policy<AlloyRevision>>;
