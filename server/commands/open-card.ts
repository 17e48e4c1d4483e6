import { QueryTypes } from 'sequelize';
import type { z } from 'zod';
import type { openCardRequest } from '#shared/contracts/card.ts';
import { describeCastingState } from '#shared/domain/casting/casting-state.ts';
import { freshCard } from '#shared/domain/pour-card/card-state.ts';
import { buildCode } from '#shared/lib/codes.ts';
import { AppError } from '../errors.ts';
import type { Melt } from '../models/melt.ts';
import type { AtTerminal } from '../policies/actor.ts';
import { meltPolicy } from '../policies/melt.ts';
import { can } from '../policies/policy.ts';
import { cardContextOf } from '../queries/card-context.ts';
import { loadCasting, type LoadedCasting } from '../queries/load-casting.ts';
import { loadCoolingFit } from '../queries/load-flask-cooling.ts';
import { loadInstruction } from '../queries/load-instruction.ts';
import { loadStudio } from '../queries/load-studio.ts';
import { refuseUnapprovedAlloy } from '../queries/refuse-unapproved-alloy.ts';
import type { Services } from '../services/services.ts';
import { appendEvent } from './append-event.ts';
import { workerFor } from '../queries/worker-for.ts';
import { occurredBetween } from './occurred-between.ts';

type OpenCard = z.output<typeof openCardRequest>;

/** Someone else has the flask: says who, and where. */
const elsewhere = async ({ models }: Services, melt: Melt): Promise<AppError> => {
  const [user, terminal] = await Promise.all([
    models.User.findByPk(melt.openedBy),
    models.Terminal.findByPk(melt.terminalId),
  ]);
  const sentence = `${user?.name} has this flask at ${terminal?.name}. Ask there, or choose another flask.`;
  return new AppError('card-elsewhere', sentence);
};

/** Goes on with an open card: at the terminal that holds it, or taken along from another one. */
const carryOn = async (
  services: Services,
  actor: AtTerminal,
  melt: Melt,
  request: OpenCard,
): Promise<Melt> => {
  const holdsIt = melt.terminalId === actor.terminal.id;
  const mayTakeAlong = request.carryOn && can(meltPolicy.takeAlong, actor, melt);
  if (!holdsIt && !mayTakeAlong) throw await elsewhere(services, melt);
  if (holdsIt && melt.openedBy === actor.person.id) return melt;
  const worker = await workerFor(services, actor, melt.alloyRevisionId);
  await melt.update({ terminalId: actor.terminal.id, openedBy: actor.person.id });
  await appendEvent(services, actor, melt, { ...request, event: { type: 'carried-on', worker } });
  return melt;
};

const nextMeltNumber = async ({ sequelize }: Services): Promise<number> => {
  const rows = await sequelize.query<{ number: number }>(`select nextval('melt_numbers')::int as number`, {
    type: QueryTypes.SELECT,
  });
  if (!rows[0]) throw new Error('The sequence of melt numbers gave none.');
  return rows[0].number;
};

const refuseUnready = (casting: LoadedCasting): void => {
  const { state } = casting;
  if (state !== 'holding') {
    throw new AppError(
      'wrong-state',
      `This flask is ${describeCastingState(state)}. A card opens when the flask is holding.`,
    );
  }
  refuseUnapprovedAlloy(casting);
};

const begin = async (
  services: Services,
  actor: AtTerminal,
  casting: LoadedCasting,
  request: OpenCard,
): Promise<Melt> => {
  refuseUnready(casting);
  const worker = await workerFor(services, actor, casting.alloyRevisionId);
  const studio = await loadStudio(services);
  const instruction = await loadInstruction(services);
  const coolingFit = await loadCoolingFit(services, casting.flask.diameterMm);
  const number = await nextMeltNumber(services);
  const melt = await services.models.Melt.create({
    number,
    code: buildCode('M', number),
    castingId: casting.id,
    alloyRevisionId: casting.alloyRevisionId,
    workInstructionRevisionId: instruction.id,
    context: cardContextOf(casting, studio, { instruction, coolingFit }),
    state: freshCard,
    openedBy: actor.person.id,
    terminalId: actor.terminal.id,
    openedAt: occurredBetween(request.occurredAt, null, services.now()),
  });
  await casting.update({ meltId: melt.id });
  await appendEvent(services, actor, melt, { ...request, event: { type: 'card-opened', worker } });
  return melt;
};

/**
 * Opens a casting's card at this terminal, or goes on with it. The casting's row is locked meanwhile, so that of two
 * terminals one gets the flask and the other is told who has it.
 */
export const openCard = (
  services: Services,
  actor: AtTerminal,
  castingId: string,
  request: OpenCard,
): Promise<Melt> =>
  services.sequelize.transaction(async () => {
    await services.models.Casting.findByPk(castingId, { lock: true });
    const casting = await loadCasting(services, castingId);
    const melt =
      casting.meltId === null ? null : await services.models.Melt.findByPk(casting.meltId, { lock: true });
    return melt && melt.overAt === null
      ? carryOn(services, actor, melt, request)
      : begin(services, actor, casting, request);
  });
