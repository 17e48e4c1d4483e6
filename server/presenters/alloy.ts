import type {
  Alloy as AlloyContract,
  AlloyRevision as AlloyRevisionContract,
} from '#shared/contracts/alloy.ts';
import { driftOfFigures } from '#shared/domain/alloy/figures-of-composition.ts';
import type { Actor } from '../policies/actor.ts';
import { alloyPolicy, alloyRevisionPolicy } from '../policies/alloy.ts';
import { can } from '../policies/policy.ts';
import type { LoadedAlloy, LoadedRevision } from '../queries/load-alloy.ts';

/** One revision of an alloy, with what today's engine makes of it. */
export const presentRevision = (revision: LoadedRevision, actor: Actor): AlloyRevisionContract => ({
  id: revision.id,
  number: revision.number,
  status: revision.status,
  compositionWt: revision.compositionWt,
  toleranceWt: revision.toleranceWt,
  fineness: revision.fineness,
  figures: revision.figures,
  outsideModel: revision.outsideModel,
  drift: driftOfFigures(revision.compositionWt, revision.figures),
  quench: revision.quench,
  measured: revision.measured,
  note: revision.note,
  draftedBy: revision.drafter.name,
  checkedBy: revision.checker?.name ?? null,
  checkedAt: revision.checkedAt?.toISOString() ?? null,
  approvedBy: revision.approver?.name ?? null,
  approvedAt: revision.approvedAt?.toISOString() ?? null,
  abilities: {
    check: can(alloyRevisionPolicy.check, actor, revision),
    approve: can(alloyRevisionPolicy.approve, actor, revision),
  },
});

/** An alloy with its revisions, newest first. */
export const presentAlloy = (alloy: LoadedAlloy, actor: Actor): AlloyContract => ({
  id: alloy.id,
  name: alloy.name,
  family: alloy.family,
  revisions: alloy.revisions.map((revision) => presentRevision(revision, actor)),
  abilities: { revise: can(alloyPolicy.revise, actor, undefined) },
});
