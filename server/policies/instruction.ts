import type { WorkInstructionRevision } from '../models/work-instruction-revision.ts';
import { isAny, isSignedIn, type Actor } from './actor.ts';
import type { Policy } from './policy.ts';

const ownerAtDesk = (actor: Actor): boolean => actor.via === 'desk' && isAny(actor, 'owner');
const isDraft = (_actor: Actor, { status }: WorkInstructionRevision): boolean => status === 'draft';

/** Who may read the work instruction, and see and draft its revisions. */
export const instructionPolicy = {
  list: { who: isSignedIn },
  read: { who: isSignedIn },
  draft: { who: ownerAtDesk },
} satisfies Record<string, Policy>;

/** Who may take a draft of the work instruction forward. */
export const instructionDraftPolicy = {
  change: { who: ownerAtDesk, when: isDraft },
  drop: { who: ownerAtDesk, when: isDraft },
  /** Whoever knows the furnace; that it is not who drafted it, the command sees to. */
  approve: { who: (actor: Actor) => actor.via === 'desk' && isAny(actor, 'owner', 'caster'), when: isDraft },
} satisfies Record<string, Policy<WorkInstructionRevision>>;
