import type { Grams } from '#shared/lib/units.ts';
import type { LotKind } from '../metal/lot.ts';
import type { ChargedLot } from './card-state.ts';

/** How much of which lot is to be weighed in, as planned or as it remains. */
export interface WantedLot {
  readonly lotId: string;
  readonly code: string;
  readonly name: string;
  readonly kind: LotKind;
  readonly massG: Grams;
}

/** One lot of a charge while it is weighed in. */
export interface ChargeLineState extends Omit<WantedLot, 'massG'> {
  /** By the plan; nought for a lot that is not in it. */
  readonly plannedG: Grams;
  readonly inG: Grams;
  /** Still to go, corrected for what was really weighed where that is known. */
  readonly toGoG: Grams;
  readonly state: 'done' | 'next' | 'to-come' | 'over';
}

/** What a charge is weighed in by. */
export interface ChargeProgress {
  readonly plan: readonly WantedLot[];
  readonly lots: readonly ChargedLot[];
  /** What remains by the server's computation; null while it is not known. */
  readonly remainder: readonly WantedLot[] | null;
  /** How far a mass may be off, as a share of it. */
  readonly tolerance: number;
}

/** Two steps of the balance: nobody weighs closer than that. */
const leastToleranceG = 0.02;

const round = (grams: number): Grams => Math.round(grams * 1000) / 1000;

/** How far the mass of a line may be off, g. */
export const lineToleranceG = (plannedG: Grams, tolerance: number): Grams =>
  Math.max(leastToleranceG, plannedG * tolerance);

type Line = Omit<ChargeLineState, 'state'>;

const lineOf = ({ plan, lots, remainder }: ChargeProgress, lotId: string): readonly Line[] => {
  const isOfLot = (wanted: WantedLot): boolean => wanted.lotId === lotId;
  const planned = plan.find(isOfLot);
  const rest = remainder?.find(isOfLot);
  const charged = lots.find(({ id }) => id === lotId);
  const inG = charged?.massG ?? 0;
  const plannedG = planned?.massG ?? 0;
  const toGoG = remainder ? (rest?.massG ?? 0) : Math.max(0, round(plannedG - inG));
  const named = planned ?? rest ?? (charged && { ...charged, name: '' });
  if (!named) return [];
  const { code, name, kind } = named;
  return [{ lotId, code, name, kind, plannedG, inG, toGoG }];
};

/** The lots of a charge in the order of the plan, then those that came in without it; one of them is the next. */
export const chargeLines = (progress: ChargeProgress): readonly ChargeLineState[] => {
  const { plan, lots, remainder, tolerance } = progress;
  const ids = new Set([
    ...plan.map(({ lotId }) => lotId),
    ...lots.map(({ id }) => id),
    ...(remainder ?? []).map(({ lotId }) => lotId),
  ]);
  const lines = [...ids].flatMap((id) => lineOf(progress, id));
  const isShort = ({ inG, toGoG }: Line): boolean => toGoG > lineToleranceG(inG + toGoG, tolerance);
  const next = lines.find(isShort)?.lotId;
  const isOver = ({ plannedG, inG, toGoG }: Line): boolean =>
    plan.length > 0 && toGoG === 0 && inG > plannedG + lineToleranceG(plannedG, tolerance);
  return lines.map((line) => {
    if (line.lotId === next) return { ...line, state: 'next' };
    if (isShort(line)) return { ...line, state: 'to-come' };
    return { ...line, state: isOver(line) ? 'over' : 'done' };
  });
};

/** What a line was to be before it was corrected, g; null where it is as planned. */
export const correctedFromG = ({ plannedG, inG, toGoG }: ChargeLineState): Grams | null => {
  const asPlannedG = Math.max(0, round(plannedG - inG));
  return toGoG > 0 && Math.abs(toGoG - asPlannedG) >= leastToleranceG / 2 ? asPlannedG : null;
};
