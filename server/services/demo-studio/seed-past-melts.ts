import { randomBytes, randomUUID } from 'node:crypto';
import type { CardEvent, ChargeKind, ChargeLot } from '#shared/domain/pour-card/card-event.ts';
import type { CardContext } from '#shared/domain/pour-card/card-state.ts';
import type { CardStep } from '#shared/domain/pour-card/card-step.ts';
import { openVariances, wantsCountersign } from '#shared/domain/pour-card/apply-variance.ts';
import { stepsBefore } from '#shared/domain/instruction/step-applies.ts';
import { moveCasting } from '../../commands/move-casting.ts';
import { openCard } from '../../commands/open-card.ts';
import { recordEvent } from '../../commands/record-event.ts';
import type { Casting } from '../../models/casting.ts';
import type { User } from '../../models/user.ts';
import type { Terminal } from '../../models/terminal.ts';
import type { AtTerminal } from '../../policies/actor.ts';
import { hashToken } from '../hashing.ts';
import type { Services } from '../services.ts';
import type { DemoCasting } from './castings.ts';
import { lotKey, type SeededLots } from './seed-lots.ts';
import type { SeededRecords } from './seed-records.ts';

type Past = NonNullable<DemoCasting['past']>;

/** The events of a finished melt, each with the seconds since its card was opened. */
const eventsOf = (
  past: Past,
  casting: Casting,
  { figures: { liquidusC, pourC, quench }, rules }: CardContext,
  lotOf: (kind: ChargeKind) => ChargeLot,
): readonly (readonly [number, CardEvent])[] => {
  const { plannedMetalG } = casting;
  const keysBefore = (part: CardStep): readonly string[] =>
    stepsBefore(rules?.steps ?? [], part, 'caster').map(({ key }) => key);
  const checks = (seconds: number, part: CardStep): readonly (readonly [number, CardEvent])[] => {
    const keys = keysBefore(part);
    return keys.length > 0 ? [[seconds, { type: 'checked', keys }]] : [];
  };
  const returns = Math.round(plannedMetalG * 0.35 * 100) / 100;
  const button = Math.round(plannedMetalG * 0.11 * 100) / 100;
  const loss = Math.round(plannedMetalG * 0.002 * 1000) / 1000;
  const flaskOut = 620;
  const poured = flaskOut + past.secondsToPour;
  const quenched = poured + quench.earliestS + 25;
  return [
    [20, { type: 'guard-confirmed', prompts: keysBefore('guard') }],
    ...checks(40, 'charge'),
    [75, { type: 'charge-weighed', kind: 'returns', massG: returns, lot: lotOf('returns') }],
    [
      130,
      {
        type: 'charge-weighed',
        kind: 'grain',
        massG: Math.round((plannedMetalG - returns) * 1000) / 1000,
        lot: lotOf('grain'),
      },
    ],
    [140, { type: 'charge-closed' }],
    [330, { type: 'reading-taken', temperatureC: Math.round(liquidusC - 60), confirmed: false }],
    [450, { type: 'reading-taken', temperatureC: Math.round(liquidusC + 30), confirmed: false }],
    [590, { type: 'reading-taken', temperatureC: pourC.target, confirmed: false }],
    [600, { type: 'melt-ready' }],
    ...checks(610, 'flask-out'),
    [flaskOut, { type: 'flask-out', furnaceC: null }],
    [poured, { type: 'poured' }],
    [quenched, { type: 'quenched' }],
    [
      quenched + 90,
      { type: 'closed', buttonMassG: button, lossMassG: loss, look: past.look, note: past.note },
    ],
  ];
};

const lotsOf =
  (lots: SeededLots, alloy: string) =>
  (kind: ChargeKind): ChargeLot => {
    const lot = lots.get(lotKey(alloy, kind));
    if (!lot) throw new Error(`The demo studio has no ${kind} of ${alloy}.`);
    const { id, code, compositionWt, toleranceWt } = lot;
    return { id, code, kind: lot.kind, compositionWt, toleranceWt };
  };

/** When all is over, long after any quench. */
const afterPourS = 3600;

const runCard = async (
  services: Services,
  actor: AtTerminal,
  {
    demo,
    casting,
    lots,
    signer,
  }: {
    readonly demo: DemoCasting;
    readonly casting: Casting;
    readonly lots: SeededLots;
    readonly signer: User;
  },
): Promise<void> => {
  if (!demo.past) return;
  const openedMs = casting.plannedPourAt.getTime() - 640_000;
  const at = (seconds: number): Services => ({ ...services, now: () => new Date(openedMs + seconds * 1000) });
  const stamp = (seconds: number) => ({
    key: randomUUID(),
    occurredAt: new Date(openedMs + seconds * 1000).toISOString(),
  });
  const melt = await openCard(at(0), actor, casting.id, { ...stamp(0), carryOn: false });
  const lotOf = lotsOf(lots, demo.alloy);
  for (const [seconds, event] of eventsOf(demo.past, casting, melt.context, lotOf)) {
    // The contract's arrays are mutable where the domain's are not.
    await recordEvent(at(seconds), actor, melt.id, { ...stamp(seconds), event: event as never });
  }
  await explainDepartures(at(afterPourS), actor, melt.id, signer);
};

/** Gives each departure of a melt its reason, with a second person's sign where the card wants one. */
const explainDepartures = async (
  services: Services,
  actor: AtTerminal,
  meltId: string,
  signer: User,
): Promise<void> => {
  const melt = await services.models.Melt.findByPk(meltId, { rejectOnEmpty: true });
  for (const { index, departure } of openVariances(melt.state, melt.context)) {
    const sign = { id: randomUUID(), personId: signer.id, name: signer.name, onDevice: false };
    const by = wantsCountersign(departure, melt.state) ? sign : null;
    const occurredAt = services.now();
    if (by) {
      await services.models.Countersign.create({
        ...by,
        meltId,
        askedBy: actor.person.id,
        terminalId: actor.terminal.id,
        signedAt: occurredAt,
      });
    }
    const words = 'Talked over after the pour.';
    const event = { type: 'variance-explained', index, reason: 'time', words, hold: false, by } as const;
    await recordEvent(services, actor, meltId, {
      key: randomUUID(),
      occurredAt: occurredAt.toISOString(),
      event,
    });
  }
};

/** Writes the melts already poured by the very commands a terminal uses, at a terminal that has since been put away. */
export const seedPastMelts = async (
  services: Services,
  { people, castings }: SeededRecords,
  lots: SeededLots,
): Promise<void> => {
  const terminal: Terminal = await services.models.Terminal.create({
    name: 'Old terminal',
    bay: 'furnace bay 1',
    tokenHash: hashToken(randomBytes(32).toString('base64url')),
  });
  for (const [demo, casting] of castings) {
    const user = demo.past && people.get(demo.past.by);
    if (!user) continue;
    const actor: AtTerminal = { person: user, terminal, via: 'terminal' };
    const signer = people.get(demo.past?.by === 'maren' ? 'ines' : 'maren');
    if (!signer) throw new Error('The demo studio has nobody to sign.');
    await runCard(services, actor, { demo, casting, lots, signer });
    if (demo.inMinutes > -1000) continue;
    for (const to of ['broken-out', 'cut', 'released'] as const) {
      await moveCasting(services, actor, casting, { to, reason: '' });
    }
  }
  await terminal.update({ revokedAt: services.now() });
};
