import type {
  Lot as LotContract,
  LotDetail,
  LotDocument as LotDocumentContract,
} from '#shared/contracts/lot.ts';
import { fromMilligrams } from '#shared/domain/metal/ledger.ts';
import type { Actor } from '../policies/actor.ts';
import { lotPolicy } from '../policies/lot.ts';
import { can } from '../policies/policy.ts';
import type { LoadedLot, LotWithHistory } from '../queries/load-lot.ts';

/** A lot of metal, with what the actor may do. */
export const presentLot = (lot: LoadedLot, actor: Actor): LotContract => ({
  id: lot.id,
  code: lot.code,
  name: lot.name,
  kind: lot.kind,
  alloy: lot.alloyRevision && {
    id: lot.alloyRevision.alloy.id,
    name: lot.alloyRevision.alloy.name,
    revisionId: lot.alloyRevision.id,
  },
  melt: lot.melt && { id: lot.melt.id, code: lot.melt.code },
  compositionWt: lot.compositionWt,
  toleranceWt: lot.toleranceWt,
  supplier: lot.supplier,
  supplierReference: lot.supplierReference,
  place: lot.place,
  quarantineReason: lot.quarantineReason,
  receivedG: fromMilligrams(lot.receivedMg),
  balanceG: fromMilligrams(lot.balanceMg),
  contentsMg: lot.contentsMg,
  receivedAt: lot.receivedAt.toISOString(),
  receivedBy: lot.receiver.name,
  abilities: {
    amend: can(lotPolicy.amend, actor, lot),
    release: can(lotPolicy.release, actor, lot),
    count: can(lotPolicy.count, actor, lot),
    dispatch: can(lotPolicy.dispatch, actor, lot),
  },
});

/** A certificate or photograph of a lot. */
export const presentLotDocument = (document: LotWithHistory['documents'][number]): LotDocumentContract => ({
  id: document.id,
  name: document.name,
  mediaType: document.mediaType,
  bytes: document.bytes,
  sha256: document.sha256,
  person: document.user.name,
  at: document.createdAt.toISOString(),
});

/** A lot with its papers, its amendments and where its metal went. */
export const presentLotDetail = (history: LotWithHistory, actor: Actor): LotDetail => ({
  ...presentLot(history.lot, actor),
  documents: history.documents.map(presentLotDocument),
  amendments: history.amendments.map(
    ({ kind, compositionWt, toleranceWt, place, reason, user, createdAt }) => ({
      kind,
      compositionWt,
      toleranceWt,
      place,
      reason,
      person: user.name,
      at: createdAt.toISOString(),
    }),
  ),
  melts: history.melts.map(({ id, code, massMg }) => ({ id, code, massG: fromMilligrams(massMg) })),
  becameLots: history.becameLots.map(({ id, code, name }) => ({ id, code, name })),
});
