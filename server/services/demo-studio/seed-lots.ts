import { randomUUID } from 'node:crypto';
import { receiveLot } from '../../commands/receive-lot.ts';
import type { Lot } from '../../models/lot.ts';
import type { SignedIn } from '../../policies/actor.ts';
import type { Services } from '../services.ts';
import { demoLots } from './lots.ts';
import type { SeededRecords } from './seed-records.ts';

const dayMs = 24 * 3600 * 1000;

/** The demo studio's lots that may be charged, by the alloy's key and their kind. */
export type SeededLots = ReadonlyMap<string, Lot>;

/** The name under which a lot of an alloy is found. */
export const lotKey = (alloy: string, kind: 'grain' | 'returns'): string => `${alloy} ${kind}`;

/** Takes the demo studio's lots in by the very command the desk uses. */
export const seedLots = async (
  services: Services,
  { people, revisions }: Pick<SeededRecords, 'people' | 'revisions'>,
): Promise<SeededLots> => {
  const owner = people.get('maren');
  if (!owner) throw new Error('The demo studio has no owner.');
  const actor: SignedIn = { person: owner, terminal: null, via: 'desk' };
  const lots = new Map<string, Lot>();
  for (const { alloy, daysAgo, reference, quarantineReason = '', ...demo } of demoLots) {
    const lot = await receiveLot(services, actor, {
      ...demo,
      compositionWt: { ...demo.compositionWt },
      toleranceWt: { ...demo.toleranceWt },
      key: randomUUID(),
      alloyRevisionId: alloy === null ? null : (revisions.get(alloy)?.id ?? null),
      supplierReference: reference,
      receivedAt: new Date(services.now().getTime() - daysAgo * dayMs).toISOString(),
      quarantineReason,
      confirmed: false,
    });
    const isUsable = lot.kind === 'grain' || lot.kind === 'returns';
    if (alloy !== null && isUsable && quarantineReason === '')
      lots.set(lotKey(alloy, lot.kind === 'returns' ? 'returns' : 'grain'), lot);
  }
  return lots;
};
