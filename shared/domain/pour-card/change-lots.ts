import { ok, refuse, type Result } from '#shared/lib/result.ts';
import { formatMass, type Grams, type MassUnit } from '#shared/lib/units.ts';
import type { ChargeLot } from './card-event.ts';
import type { ChargedLot } from './card-state.ts';

const roundMass = (grams: number): number => Math.round(grams * 1000) / 1000;

/** What of each lot is in the crucible after weighing `byG` of one in, or out when below nought. */
export const changeLots = (
  lots: readonly ChargedLot[],
  lot: ChargeLot,
  byG: Grams,
  unit: MassUnit,
): Result<readonly ChargedLot[]> => {
  const before = lots.find(({ id }) => id === lot.id)?.massG ?? 0;
  const massG = roundMass(before + byG);
  if (massG < 0) {
    return refuse(
      `Only ${formatMass(before, unit)} of lot ${lot.code} is in the crucible, so no more can be taken out.`,
    );
  }
  const others = lots.filter(({ id }) => id !== lot.id);
  if (massG === 0) return ok(others);
  // In the order in which they first came in.
  return before === 0
    ? ok([...lots, { ...lot, massG }])
    : ok(lots.map((each) => (each.id === lot.id ? { ...lot, massG } : each)));
};
