import type { Services } from '#server/services/services.ts';
import { saveChargePlan } from '#server/commands/save-charge-plan.ts';
import { demoLots } from '#server/services/demo-studio/lots.ts';
import type { Lot } from '#server/models/lot.ts';
import type { LotKind } from '#shared/domain/metal/lot.ts';

/** A lot of the demo studio by its name and kind. */
export const demoLot = async ({ models }: Services, name: RegExp, kind: LotKind): Promise<Lot> => {
  const demo = demoLots.find((lot) => lot.kind === kind && name.test(lot.name));
  if (!demo) throw new Error(`The demo studio has no ${kind} called ${name.source}.`);
  const { name: exact } = demo;
  return models.Lot.findOne({ where: { name: exact, kind }, rejectOnEmpty: true });
};

/** Keeps a charge plan for a casting, in the owner's name, by the command the desk uses. */
export const planChargeFor = async (
  services: Services,
  castingId: string,
  lines: readonly { readonly lot: Lot; readonly massG: number }[],
): Promise<void> => {
  const person = await services.models.User.findOne({ where: { login: 'maren' }, rejectOnEmpty: true });
  await saveChargePlan(
    services,
    { person, terminal: null, via: 'desk' },
    {
      castingIds: [castingId],
      lossShare: 0,
      lines: lines.map(({ lot, massG }) => ({ lotId: lot.id, massG })),
    },
  );
};
