import { addContents, contentsOf, partsOfContents, type Contents } from '#shared/domain/metal/contents.ts';
import { storeOf, toMilligrams } from '#shared/domain/metal/ledger.ts';
import { lotKindNames, mayBeCharged } from '#shared/domain/metal/lot.ts';
import type { ChargeWeighing } from '#shared/domain/pour-card/card-event.ts';
import { AppError } from '../errors.ts';
import type { Lot } from '../models/lot.ts';
import type { Melt } from '../models/melt.ts';
import type { MeltEvent } from '../models/melt-event.ts';
import type { AtTerminal } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { closeOut } from './close-out.ts';
import { contentsTaken, lockLot } from './lock-lot.ts';
import { writeMovement, type NewMovement } from './write-movement.ts';

const refuseUnusable = ({ code, kind, quarantineReason }: Lot): void => {
  if (quarantineReason !== null)
    throw new AppError(
      'event-refused',
      `Lot ${code} is in quarantine: ${quarantineReason} Put it aside, take another.`,
    );
  if (!mayBeCharged(kind))
    throw new AppError(
      'event-refused',
      `Lot ${code} is ${lotKindNames[kind]}: it does not go into a crucible.`,
    );
};

/** What a melt's crucible has of a lot by the ledger. */
const inCrucible = async (
  { models }: Services,
  meltId: string,
  lotId: string,
): Promise<{ readonly massMg: number; readonly contentsMg: Contents }> => {
  const movements = await models.MetalMovement.findAll({ where: { meltId, lotId } });
  const sign = (toPlace: string): 1 | -1 => (toPlace === 'crucible' ? 1 : -1);
  return {
    massMg: movements.reduce((sum, { toPlace, massMg }) => sum + sign(toPlace) * massMg, 0),
    contentsMg: movements.reduce<Contents>(
      (sum, { toPlace, contentsMg }) => addContents(sum, contentsMg, sign(toPlace)),
      {},
    ),
  };
};

const weigh = async (
  services: Services,
  { person, terminal }: AtTerminal,
  melt: Melt,
  { key, occurredAt }: MeltEvent,
  {
    type,
    massG,
    lot: { id },
  }: ChargeWeighing & { readonly type: string; readonly lot: { readonly id: string } },
): Promise<void> => {
  const lot = await lockLot(services, id);
  const massMg = toMilligrams(massG);
  const store = storeOf(lot.kind);
  const common = {
    key,
    massMg,
    lot,
    meltId: melt.id,
    userId: person.id,
    terminalId: terminal.id,
    occurredAt,
  };
  if (type === 'charge-weighed') {
    refuseUnusable(lot);
    const contentsMg = contentsTaken(lot, massMg);
    await writeMovement(services, { ...common, kind: 'weighed-in', from: store, to: 'crucible', contentsMg });
    return;
  }
  const there = await inCrucible(services, melt.id, lot.id);
  const contentsMg =
    massMg === there.massMg ? there.contentsMg : contentsOf(massMg, partsOfContents(there.contentsMg));
  const back: NewMovement = { ...common, kind: 'taken-out', from: 'crucible', to: store, contentsMg };
  await writeMovement(services, back);
};

/**
 * Moves metal in the ledger as an event of a card says; a card whose metal is of no lot moves none. Joins the caller's
 * transaction, so that the book and the ledger never part.
 */
export const moveMetalAlong = async (
  services: Services,
  actor: AtTerminal,
  melt: Melt,
  recorded: MeltEvent,
): Promise<void> => {
  const { event } = recorded;
  switch (event.type) {
    case 'charge-weighed':
    case 'charge-taken-out': {
      const { lot } = event;
      if (lot) await weigh(services, actor, melt, recorded, { ...event, lot });
      return;
    }
    case 'closed':
      await closeOut(services, actor, melt, {
        buttonMg: toMilligrams(event.buttonMassG),
        lossMg: toMilligrams(event.lossMassG),
        reason: event.note,
        occurredAt: recorded.occurredAt,
      });
      return;
    default:
      return;
  }
};
