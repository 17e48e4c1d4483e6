import type { Casting as CastingContract } from '#shared/contracts/casting.ts';
import type { Actor } from '../policies/actor.ts';
import { castingPolicy } from '../policies/casting.ts';
import { can } from '../policies/policy.ts';
import type { LoadedCasting } from '../queries/load-casting.ts';

/** A casting as its contract lists it, with what the actor may do. */
export const presentCasting = (casting: LoadedCasting, actor: Actor): CastingContract => {
  const { flask, tree, alloyRevision, caster, melt } = casting;
  return {
    id: casting.id,
    flask: { code: flask.code, diameterMm: flask.diameterMm, heightMm: flask.heightMm },
    tree: {
      code: tree.code,
      waxMassG: tree.waxMassG,
      thinnestSectionMm: tree.thinnestSectionMm,
      pieces: tree.pieces,
      description: tree.description,
    },
    alloy: {
      id: alloyRevision.alloy.id,
      name: alloyRevision.alloy.name,
      family: alloyRevision.alloy.family,
      fineness: alloyRevision.fineness,
      revisionId: alloyRevision.id,
      revision: alloyRevision.number,
    },
    method: casting.method,
    state: casting.state,
    stateReason: casting.stateReason,
    plannedMetalG: casting.plannedMetalG,
    plannedPourAt: casting.plannedPourAt.toISOString(),
    bay: casting.bay,
    plannedBy: casting.planner.name,
    caster: caster ? { id: caster.id, name: caster.name } : null,
    melt: melt ? { id: melt.id, code: melt.code } : null,
    abilities: { move: can(castingPolicy.move, actor, casting) },
  };
};
