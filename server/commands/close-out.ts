import { randomUUID } from 'node:crypto';
import { shareOut } from '#shared/domain/metal/share-out.ts';
import { mixAssay } from '#shared/domain/metal/lot.ts';
import { AppError } from '../errors.ts';
import type { Lot } from '../models/lot.ts';
import type { Melt } from '../models/melt.ts';
import type { Actor, SignedIn } from '../policies/actor.ts';
import { weighedInto } from '../queries/weighed-into.ts';
import type { Services } from '../services/services.ts';
import { nextLotCode } from './receive-lot.ts';
import { writeMovement, type NewMovement } from './write-movement.ts';

/** What came out of a crucible: the button, what was lost; the rest is in the castings. Whole milligrams. */
export interface Outcome {
  readonly buttonMg: number;
  readonly lossMg: number;
  readonly reason: string;
  readonly occurredAt: Date;
}

const makeButtonLot = async (
  services: Services,
  { person }: SignedIn,
  melt: Melt,
  { buttonMg, occurredAt }: Outcome,
): Promise<Lot> =>
  services.models.Lot.create({
    ...(await nextLotCode(services)),
    name: `Button of ${melt.code}`,
    kind: 'returns',
    alloyRevisionId: melt.alloyRevisionId,
    meltId: melt.id,
    ...mixAssay(await weighedInto(services, melt.id)),
    receivedMg: buttonMg,
    receivedAt: occurredAt,
    receivedBy: person.id,
    createdAt: services.now(),
  });

/**
 * Empties a melt's crucible in the ledger: what was lost, the button as a new lot of returns with the melt's computed
 * assay, the rest into the castings. Does nothing where the ledger has no metal in it. Joins the caller's transaction.
 */
export const closeOut = async (
  services: Services,
  actor: SignedIn & Pick<Actor, 'terminal'>,
  melt: Melt,
  outcome: Outcome,
): Promise<void> => {
  const crucible = await services.models.Crucible.findByPk(melt.id);
  if (!crucible || crucible.balanceMg === 0) return;
  const { buttonMg, lossMg, reason, occurredAt } = outcome;
  const shared = shareOut(crucible.contentsMg, { buttonMg, lossMg });
  if (!shared) {
    throw new AppError(
      'not-enough-metal',
      `Button and loss come to more than the ${(crucible.balanceMg / 1000).toFixed(3)} g in the crucible. Weigh again.`,
    );
  }
  const move = (to: NewMovement['to'], kind: NewMovement['kind'], part: keyof typeof shared, lot?: Lot) =>
    shared[part].massMg === 0
      ? Promise.resolve(null)
      : writeMovement(services, {
          key: randomUUID(),
          kind,
          from: 'crucible',
          to,
          ...shared[part],
          lot,
          meltId: melt.id,
          reason: part === 'loss' ? reason : '',
          userId: actor.person.id,
          terminalId: actor.terminal?.id ?? null,
          occurredAt,
        });
  await move('loss', 'lost', 'loss');
  if (buttonMg > 0)
    await move('returns', 'returned', 'button', await makeButtonLot(services, actor, melt, outcome));
  await move('castings', 'cast', 'castings');
};
