import type { ChargeRequest } from '#shared/domain/metal/charge-request.ts';
import type { LotKind, LotOnHand, Parts } from '#shared/domain/metal/lot.ts';

const kinds: readonly LotKind[] = ['fine', 'grain', 'grain', 'master', 'returns', 'returns'];

const round = (parts: Parts): Parts =>
  Object.fromEntries(Object.entries(parts).map(([element, wt]) => [element, Math.round(wt * 100) / 100]));

const partsOf = (kind: LotKind, index: number, random: () => number): Parts => {
  if (kind === 'fine') return [{ Au: 99.99 }, { Ag: 99.99 }, { Cu: 99.9 }][index % 3] ?? { Au: 99.99 };
  const silver = kind === 'master' ? 40 + 20 * random() : 12.5 + (random() - 0.5) * 1.5;
  if (kind === 'master') return round({ Ag: silver, Cu: 100 - silver });
  const gold = 75 + (random() - 0.4) * 0.6;
  return round({ Au: gold, Ag: silver, Cu: 100 - gold - silver });
};

const lotOf = (index: number, random: () => number): LotOnHand => {
  const kind = index < 3 ? 'fine' : (kinds[Math.floor(random() * kinds.length)] ?? 'grain');
  const compositionWt = partsOf(kind, index, random);
  return {
    id: `lot-${index}`,
    code: `L-${String(index).padStart(4, '0')}`,
    name: kind,
    kind,
    compositionWt,
    toleranceWt: Object.fromEntries(
      Object.entries(compositionWt).map(([element, wt]) => [
        element,
        wt > 99 ? 0.005 : 0.02 + 0.05 * random(),
      ]),
    ),
    balanceMg: Math.round(2000 + random() * 60_000),
    receivedAt: new Date(1.76e12 + index * 1e8).toISOString(),
  };
};

/** A charge of 18 ct yellow, 84.20 g unless told otherwise, from `count` lots such as a studio has: fine metal, grain, master alloy, returns. */
export const randomCharge = (count: number, random: () => number, wantedMg = 84_200): ChargeRequest => ({
  wantedMg,
  targetWt: { Au: 75, Ag: 12.5, Cu: 12.5 },
  toleranceWt: { Au: 0.3, Ag: 0.3, Cu: 0.3 },
  markedMetal: 'Au',
  markPpt: 750,
  returnsShare: 0.5,
  lots: Array.from({ length: count }, (_, index) => lotOf(index, random)),
});
