import type { CardEvent } from '#shared/domain/pour-card/card-event.ts';
import { isRead, openRun, openSteps } from '#shared/domain/pour-card/apply-steps.ts';
import type { Countersigned } from '#shared/domain/instruction/instruction-step.ts';
import type { Melt } from '#server/models/melt.ts';
import { PIN } from '#tests/factories/build-user.ts';
import { openCard } from './ask-for-card.ts';
import { deliverEvent } from './deliver-event.ts';
import type { Client, TestServer } from './test-server.ts';

/** Drives a card through the API as whoever is signed in at a terminal. */
export const driveCard = async (
  { services }: Pick<TestServer, 'services'>,
  client: Client,
  castingId: string,
) => {
  const { meltId } = await openCard(client, castingId);
  const melt = (): Promise<Melt> => services.models.Melt.findByPk(meltId, { rejectOnEmpty: true });
  const send = (event: CardEvent) => deliverEvent(client, meltId, event);
  const write = async (event: CardEvent): Promise<void> => void (await send(event).expect(201));
  return {
    meltId,
    melt,
    send,
    write,
    /** Reads and touches what stands open, until the card asks for something else. */
    check: async (): Promise<void> => {
      for (;;) {
        const { state, context } = await melt();
        const keys = openRun(openSteps(state, context))
          .filter(isRead)
          .map(({ key }) => key);
        if (keys.length === 0) return;
        await write({ type: 'checked', keys });
      }
    },
    /** Asks a second person for their PIN. */
    sign: async (personId: string, pin = PIN): Promise<Countersigned> =>
      (await client.post(`/api/melts/${meltId}/countersigns`).send({ personId, pin }).expect(201))
        .body as Countersigned,
  };
};

/** A card being driven. */
export type DrivenCard = Awaited<ReturnType<typeof driveCard>>;

/** Leads a card from its opening to where the flask is to come out, with all that is read and touched on the way. */
export const leadToFlaskOut = async (card: DrivenCard): Promise<void> => {
  const { context } = await card.melt();
  await card.check();
  await card.write({ type: 'guard-confirmed', prompts: [] });
  await card.check();
  await card.write({ type: 'charge-weighed', kind: 'grain', massG: context.plannedMetalG });
  await card.write({ type: 'charge-closed' });
  await card.check();
  const reading = { temperatureC: context.figures.pourC.target, confirmed: false };
  await card.write({ type: 'reading-taken', ...reading });
  await card.write({ type: 'melt-ready' });
  await card.check();
};
