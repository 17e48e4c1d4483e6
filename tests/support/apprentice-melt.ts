import { randomUUID } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import { openVariances, wantsCountersign } from '#shared/domain/pour-card/apply-variance.ts';
import { isRead, openRun, openSteps } from '#shared/domain/pour-card/apply-steps.ts';
import type { Countersigned } from '#shared/domain/instruction/instruction-step.ts';
import type { CardEvent } from '#shared/domain/pour-card/card-event.ts';
import { addPhotograph } from '#server/commands/add-photograph.ts';
import { openCard } from '#server/commands/open-card.ts';
import { recordEvent } from '#server/commands/record-event.ts';
import type { Melt } from '#server/models/melt.ts';
import type { AtTerminal } from '#server/policies/actor.ts';
import type { Services } from '#server/services/services.ts';

/** Any picture will do: our own icon. */
const picture = new URL('../../src/public/app-icon-512.png', import.meta.url);

const actorFor = async ({ models }: Services, login: string): Promise<AtTerminal> => ({
  person: await models.User.findOne({ where: { login }, rejectOnEmpty: true }),
  terminal: await models.Terminal.findOne({ rejectOnEmpty: true }),
  via: 'terminal',
});

const signFor = async ({ models, now }: Services, melt: Melt, actor: AtTerminal): Promise<Countersigned> => {
  const signer = await models.User.findOne({ where: { login: 'ines' }, rejectOnEmpty: true });
  const id = randomUUID();
  await models.Countersign.create({
    id,
    meltId: melt.id,
    personId: signer.id,
    askedBy: actor.person.id,
    terminalId: actor.terminal.id,
    signedAt: now(),
  });
  return { id, personId: signer.id, name: signer.name, onDevice: false };
};

/**
 * The demo studio's apprentice takes a flask through its card up to the pour, signed for by Ines: the flask came out too
 * hot, which has its reason and holds the pieces; a photograph was taken; then work is stopped and nobody has said why yet.
 */
export const buildApprenticeMelt = async (services: Services): Promise<Melt> => {
  const { models, now } = services;
  const actor = await actorFor(services, 'yara');
  const casting = await models.Casting.findOne({
    where: { state: 'holding', meltId: null },
    order: [['plannedPourAt', 'DESC']],
    rejectOnEmpty: true,
  });
  const stamp = () => ({ key: randomUUID(), occurredAt: now().toISOString() });
  const melt = await openCard(services, actor, casting.id, { ...stamp(), carryOn: false });
  const write = async (event: CardEvent): Promise<void> => {
    // The contract's arrays are mutable where the domain's are not.
    await recordEvent(services, actor, melt.id, { ...stamp(), event: event as never });
    await melt.reload();
  };
  const settle = async (): Promise<void> => {
    for (;;) {
      const run = openRun(openSteps(melt.state, melt.context));
      const [first] = run;
      if (!first) return;
      if (isRead(first)) await write({ type: 'checked', keys: run.map(({ key }) => key) });
      else {
        const by = await signFor(services, melt, actor);
        await write({ type: 'step-done', key: first.key, answer: { kind: 'countersign', by } });
      }
    }
  };
  const { figures, plannedMetalG } = melt.context;
  await settle();
  await write({ type: 'guard-confirmed', prompts: [] });
  await settle();
  await write({ type: 'charge-weighed', kind: 'grain', massG: plannedMetalG });
  await write({ type: 'charge-closed' });
  await settle();
  await write({ type: 'reading-taken', temperatureC: figures.pourC.target, confirmed: false });
  await write({ type: 'melt-ready' });
  await settle();
  await write({ type: 'flask-out', furnaceC: figures.flaskHoldC + 40 });
  for (const { index, departure } of openVariances(melt.state, melt.context)) {
    const by = wantsCountersign(departure, melt.state) ? await signFor(services, melt, actor) : null;
    const words = 'The controller overshot while the door was open.';
    await write({ type: 'variance-explained', index, reason: 'equipment', words, hold: true, by });
  }
  const photographId = randomUUID();
  await addPhotograph(services, actor, melt, { id: photographId, content: await readFile(picture) });
  await write({ type: 'photographed', photographId, of: 'defect' });
  await write({ type: 'stopped', reason: 'equipment' });
  return melt;
};
