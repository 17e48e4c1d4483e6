import type { CardEvent, CastLook } from '#shared/domain/pour-card/card-event.ts';
import type { MassUnit } from '#shared/lib/units.ts';
import { readTypedMass } from './typed-mass.ts';

/** What has been filled in so far when a card is closed: masses as typed, in the studio's unit. */
export interface ClosingDraft {
  readonly button: string;
  readonly loss: string;
  readonly look: CastLook | null;
  readonly note: string;
}

/** Nothing filled in yet. */
export const emptyClosing: ClosingDraft = { button: '', loss: '', look: null, note: '' };

/** Looks of a casting in a word or two. */
export const lookWords: Readonly<Record<CastLook, string>> = {
  full: 'Full',
  misrun: 'Misrun',
  porous: 'Porous',
  cracked: 'Cracked',
  'not-seen': 'Not seen',
};

/** What closing still waits for, in a few words, or the event that closes the card. */
export type Closing =
  | { readonly ready: false; readonly waitsFor: string; readonly castG: number | null }
  | { readonly ready: true; readonly castG: number; readonly event: Extract<CardEvent, { type: 'closed' }> };

/** Judges a draft against the metal that went in, g. */
export const judgeClosing = (draft: ClosingDraft, metalInG: number, unit: MassUnit): Closing => {
  const button = readTypedMass(draft.button, unit, true);
  const loss = readTypedMass(draft.loss, unit, true);
  const castG =
    button.ok && loss.ok ? Math.round((metalInG - button.value - loss.value) * 1000) / 1000 : null;
  const waits = (waitsFor: string): Closing => ({ ready: false, waitsFor, castG });
  if (!button.ok) return waits(draft.button === '' ? 'Weigh the button first' : button.error);
  if (!loss.ok) return waits(draft.loss === '' ? 'Enter spill and loss, 0 for none' : loss.error);
  if (castG === null || castG < 0) return waits('More out than went in: weigh again');
  if (draft.look === null) return waits('Choose how the casting looks');
  return {
    ready: true,
    castG,
    event: {
      type: 'closed',
      buttonMassG: button.value,
      lossMassG: loss.value,
      look: draft.look,
      note: draft.note.trim(),
    },
  };
};
