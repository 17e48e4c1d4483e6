import type { Lot } from '#shared/contracts/lot.ts';
import { lotKindNames, mayBeCharged } from '#shared/domain/metal/lot.ts';
import type { LotCharge } from './use-lot-charge.ts';

const instead = ({ next }: Pick<LotCharge, 'next'>): string =>
  next ? `Take lot ${next.code}.` : 'Put it back.';

/** Why a lot may not go into this charge, in one sentence that says what to do; null when it may. */
export const refusalOfLot = (
  { id, code, kind, quarantineReason, balanceG }: Lot,
  charge: Pick<LotCharge, 'hasPlan' | 'lines' | 'next' | 'advice'>,
): string | null => {
  if (quarantineReason !== null)
    return `Lot ${code} is in quarantine: ${quarantineReason} Put it aside. ${instead(charge)}`;
  if (!mayBeCharged(kind))
    return `Lot ${code} is ${lotKindNames[kind]}: it does not go into a crucible. ${instead(charge)}`;
  if (balanceG <= 0)
    return `Lot ${code} is used up by the ledger. Have it counted at the desk, or take another.`;
  if (!charge.hasPlan || charge.advice?.add?.lotId === id) return null;
  const line = charge.lines.find(({ lotId }) => lotId === id);
  if (!line || (line.plannedG === 0 && line.toGoG === 0))
    return `Lot ${code} is not in this charge. ${instead(charge)}`;
  return line.state === 'done' || line.state === 'over'
    ? `Lot ${code} is in already. ${instead(charge)}`
    : null;
};
