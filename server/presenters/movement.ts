import type { Movement } from '#shared/contracts/ledger.ts';
import { fromMilligrams } from '#shared/domain/metal/ledger.ts';
import type { Actor } from '../policies/actor.ts';
import { ledgerPolicy } from '../policies/ledger.ts';
import { can } from '../policies/policy.ts';
import type { LoadedMovement } from '../queries/list-movements.ts';

/** A movement of metal, with what the actor may do. */
export const presentMovement = (movement: LoadedMovement, actor: Actor): Movement => ({
  id: movement.id,
  kind: movement.kind,
  from: movement.fromPlace,
  to: movement.toPlace,
  massG: fromMilligrams(movement.massMg),
  contentsMg: movement.contentsMg,
  lot: movement.lot && { id: movement.lot.id, code: movement.lot.code, name: movement.lot.name },
  melt: movement.melt && { id: movement.melt.id, code: movement.melt.code },
  reason: movement.reason,
  correctsId: movement.correctsId,
  person: movement.user.name,
  countersignedBy: movement.countersigner?.name ?? null,
  terminal: movement.terminal?.name ?? null,
  occurredAt: movement.occurredAt.toISOString(),
  recordedAt: movement.recordedAt.toISOString(),
  abilities: { correct: can(ledgerPolicy.correct, actor, movement) },
});
