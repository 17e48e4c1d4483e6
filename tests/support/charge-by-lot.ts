import type { Lot } from '#server/models/lot.ts';
import type { Melt } from '#server/models/melt.ts';
import type { Services } from '#server/services/services.ts';
import { chargeKindOf, type ChargeLot } from '#shared/domain/pour-card/card-event.ts';
import { buildMelt } from '#tests/factories/build-melt.ts';
import type { TerminalClient } from './test-server.ts';

/** A lot as a terminal knows it. */
export const snapshotOf = ({ id, code, kind, compositionWt, toleranceWt }: Lot): ChargeLot => ({
  id,
  code,
  kind,
  compositionWt,
  toleranceWt,
});

/** The event of weighing a lot in, or taking it out again. */
export const chargeOf = (lot: Lot, massG: number, type = 'charge-weighed') => ({
  type,
  kind: chargeKindOf(lot.kind),
  massG,
  lot: snapshotOf(lot),
});

/** A casting's card at its charge, at someone's terminal. */
export const meltAtCharge = (
  services: Services,
  { user, terminal }: Pick<TerminalClient, 'user' | 'terminal'>,
  castingId: string,
): Promise<Melt> => buildMelt(services, { castingId, user, terminal, step: 'charge' });
