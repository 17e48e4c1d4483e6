import type { CardContext, CardState } from '#shared/domain/pour-card/card-state.ts';
import { judgeCharge } from '#shared/domain/pour-card/judge-charge.ts';
import { formatPercent } from '#shared/lib/units.ts';
import type { UnitWriter } from '#kiosk/lib/unit-writer.ts';

/** What the charge step says at one moment. */
export interface ChargeWords {
  /** The number that matters, with its unit: still to go, too much, or the whole charge once it is in range. */
  readonly mass: string;
  readonly state: 'wait' | 'ready' | 'caution';
  readonly stateWords: string;
  /** What the step waits for; null when it may close. */
  readonly blocked: string | null;
}

/** Puts a charge into words: how much to go, whether it is in range, and what it waits for. */
export const chargeWords = (
  state: Pick<CardState, 'charge'>,
  context: CardContext,
  write: UnitWriter,
): ChargeWords => {
  const { kind, totalG, lowG, highG, returnsShare } = judgeCharge(state, context);
  const share = formatPercent(returnsShare);
  const limit = formatPercent(context.limits.returnsShare);
  const range = `${write.mass(lowG)} to ${write.mass(highG)}`;
  const off = write.mass(Math.abs(context.plannedMetalG - totalG));
  switch (kind) {
    case 'short':
      return {
        mass: off,
        state: 'wait',
        stateWords: 'Still to go',
        blocked: `Melt opens at ${range}`,
      };
    case 'over':
      return {
        mass: off,
        state: 'caution',
        stateWords: 'Too much: take some out',
        blocked: `Melt opens at ${range}`,
      };
    case 'too-many-returns':
      return {
        mass: write.mass(totalG),
        state: 'caution',
        stateWords: `Too many returns: ${share}`,
        blocked: `Melt opens at ${limit} returns or less`,
      };
    case 'good':
      return { mass: write.mass(totalG), state: 'ready', stateWords: 'Ready, as planned', blocked: null };
  }
};
