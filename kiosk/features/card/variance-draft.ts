import { wantsCountersign } from '#shared/domain/pour-card/apply-variance.ts';
import type { CardState } from '#shared/domain/pour-card/card-state.ts';
import type { Departure, VarianceReason } from '#shared/domain/pour-card/variance.ts';

/** What has been filled in so far for one departure. */
export interface VarianceDraft {
  readonly reason: VarianceReason | null;
  readonly words: string;
  readonly hold: boolean;
}

/** Nothing filled in yet. */
export const emptyVariance: VarianceDraft = { reason: null, words: '', hold: false };

/** What a reason still waits for, in a few words, or that it may be kept. */
export type VarianceReady =
  | { readonly ready: false; readonly waitsFor: 'reason' | 'words'; readonly sentence: string }
  | { readonly ready: true; readonly reason: VarianceReason; readonly wantsSign: boolean };

/** Judges a draft by the same rules as the card. */
export const judgeVariance = (
  draft: VarianceDraft,
  departure: Departure,
  state: Pick<CardState, 'worker'>,
): VarianceReady => {
  const wantsSign = wantsCountersign(departure, state);
  if (draft.reason === null) return { ready: false, waitsFor: 'reason', sentence: 'Choose the reason' };
  if ((draft.reason === 'other' || wantsSign) && draft.words.trim() === '')
    return { ready: false, waitsFor: 'words', sentence: 'Say in a few words what happened' };
  return { ready: true, reason: draft.reason, wantsSign };
};
