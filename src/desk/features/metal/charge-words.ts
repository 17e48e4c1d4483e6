import type { Casting } from '#shared/contracts/casting.ts';
import type { ChargeOutcome } from '#shared/contracts/charge.ts';
import type { CastingState } from '#shared/domain/casting/casting-state.ts';

type Short = Extract<ChargeOutcome, { readonly kind: 'short' }>;

/** States in which a casting still waits for its metal, the nearest to the pour first. */
const waiting: readonly CastingState[] = ['holding', 'burning-out', 'dewaxed', 'invested'];

/** Castings that still wait for their metal, those that can be poured soonest first. */
export const castingsToPlan = (castings: readonly Casting[]): readonly Casting[] =>
  castings
    .filter(({ state }) => waiting.includes(state))
    .toSorted(
      (a, b) =>
        waiting.indexOf(a.state) - waiting.indexOf(b.state) || a.plannedPourAt.localeCompare(b.plannedPourAt),
    );

/** How far a plan can be from the best there is; never said nearer than it is. */
export const gapWords = (gap: number): string => {
  if (gap <= 1e-9) return 'the best there is';
  return `within ${(Math.ceil(gap * 10_000 - 1e-9) / 100).toFixed(2)}\u00a0% of the best there is`;
};

/** A share in per cent with one decimal, never rounded down: a limit is not to be missed by it. */
export const shareWords = (share: number): string =>
  `${(Math.ceil(share * 1000 - 1e-9) / 10).toFixed(1)}\u00a0%`;

/** What would do where nothing fits, in a sentence; empty where nothing is known. */
export const wouldDoSentence = (
  { wouldDo }: Pick<Short, 'wouldDo'>,
  mass: (grams: number) => string,
): string => {
  const parts = wouldDo.map(({ name, massG }) => `${mass(massG)} of ${name}`);
  if (parts.length === 0) return '';
  return `${parts.length === 1 ? parts[0] : `${parts.slice(0, -1).join(', ')} and ${parts.at(-1)}`} would do.`;
};
