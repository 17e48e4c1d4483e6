import { randomUUID } from 'node:crypto';
import type { CountersignMeltRequest } from '#shared/contracts/card.ts';
import type { Countersigned } from '#shared/domain/instruction/instruction-step.ts';
import type { Melt } from '../models/melt.ts';
import type { AtTerminal } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { verifyCountersign } from './verify-countersign.ts';

/** Takes another person's sign for something on a melt; what it is for is told by the event that carries it. */
export const countersignMelt = async (
  services: Services,
  actor: AtTerminal,
  melt: Melt,
  sign: CountersignMeltRequest,
): Promise<Countersigned> => {
  const user = await verifyCountersign(services, actor, sign);
  const { id } = await services.sequelize.transaction(() =>
    services.models.Countersign.create({
      id: randomUUID(),
      meltId: melt.id,
      personId: user.id,
      askedBy: actor.person.id,
      terminalId: actor.terminal.id,
      signedAt: services.now(),
    }),
  );
  return { id, personId: user.id, name: user.name, onDevice: false };
};
