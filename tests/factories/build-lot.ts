import { randomUUID } from 'node:crypto';
import { amendLot } from '#server/commands/amend-lot.ts';
import { receiveLot } from '#server/commands/receive-lot.ts';
import type { Lot } from '#server/models/lot.ts';
import type { SignedIn } from '#server/policies/actor.ts';
import type { Services } from '#server/services/services.ts';
import { buildUser } from './build-user.ts';
import { nextNumber } from './sequence.ts';

/** The assay of every built lot that is given no other: sterling grain a little above its mark. */
export const STERLING_GRAIN = { compositionWt: { Ag: 92.65, Cu: 7.35 }, toleranceWt: { Ag: 0.1, Cu: 0.1 } };

type Overrides = Partial<Parameters<typeof receiveLot>[2]>;

/** Someone who may take metal in. */
export const buildKeeper = async (services: Services): Promise<SignedIn> => ({
  person: await buildUser(services, { roles: ['owner'] }),
  terminal: null,
  via: 'desk',
});

/** Builds a lot by the command the desk uses; 500 g of sterling grain unless told otherwise. */
export const buildLot = async (services: Services, overrides: Overrides = {}): Promise<Lot> =>
  receiveLot(services, await buildKeeper(services), {
    key: randomUUID(),
    name: `Grain ${nextNumber()}`,
    kind: 'grain',
    alloyRevisionId: null,
    ...STERLING_GRAIN,
    massG: 500,
    supplier: 'a refiner in the valley',
    supplierReference: '',
    place: '',
    receivedAt: services.now().toISOString(),
    quarantineReason: '',
    confirmed: true,
    ...overrides,
  });

/** Puts a lot into quarantine. */
export const quarantineLot = async (services: Services, { id }: Lot): Promise<void> =>
  amendLot(services, await buildKeeper(services), id, {
    kind: 'quarantined',
    reason: 'Colour of the grain is off.',
  });
