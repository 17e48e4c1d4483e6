import { z } from 'zod';
import type { InstructionStep } from '#shared/domain/instruction/instruction-step.ts';
import type { CardContext, CardState } from '#shared/domain/pour-card/card-state.ts';
import type { Casting } from './casting.ts';
import type { MeltEvent, Photograph } from './card.ts';
import { words, type Abilities } from './common.ts';

/** Adds a remark to a melt; what was written stays. `seq` names the event it corrects, null for the melt as a whole. */
export const amendMeltRequest = z.object({
  seq: z.int().positive().nullable(),
  note: words(2000, 'Say what is to be corrected, and why.'),
});
/** Adds a remark to a melt. */
export type AmendMeltRequest = z.infer<typeof amendMeltRequest>;

/** A page of the melt book, newest first; `before` is the code number of the last melt seen. */
export const listMeltsQuery = z.object({
  before: z.coerce.number().int().positive().optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});

/** A melt as a line of the melt book. */
export interface MeltSummary {
  readonly id: string;
  readonly code: string;
  readonly number: number;
  readonly alloyName: string;
  readonly family: Casting['alloy']['family'];
  readonly fineness: number;
  readonly flaskCode: string;
  readonly step: CardState['step'];
  readonly stopped: boolean;
  /** Why and since when work on it is stopped; null while it is not. */
  readonly stop: { readonly sentence: string; readonly at: string } | null;
  readonly openedAt: string;
  readonly pouredAt: string | null;
  readonly pourMeltC: number | null;
  readonly metalInG: number;
  readonly castMassG: number | null;
  readonly lossMassG: number | null;
  readonly person: string;
  readonly terminal: string;
  readonly departures: number;
  /** Departures that still want their reason. */
  readonly openVariances: number;
  /** Whether a reason on it asks for its pieces to be held. */
  readonly holdsPieces: boolean;
}

/** A page of the melt book. */
export interface MeltPage {
  readonly melts: readonly MeltSummary[];
  /** Where the next page begins, or null at the end of the book. */
  readonly next: number | null;
}

/** A remark added after the fact. */
export interface Amendment {
  readonly seq: number | null;
  readonly note: string;
  readonly person: string;
  readonly at: string;
}

/** One melt with everything that happened on it. */
export interface Melt extends MeltSummary {
  readonly casting: Casting;
  readonly compositionWt: Readonly<Record<string, number>>;
  readonly rangeBasis: 'computed' | 'measured';
  readonly context: CardContext;
  readonly instructionRevision: number;
  /** The instruction's steps that belong to this work, in order. */
  readonly steps: readonly InstructionStep[];
  readonly state: CardState;
  readonly events: readonly MeltEvent[];
  readonly amendments: readonly Amendment[];
  readonly photographs: readonly Photograph[];
  readonly abilities: Abilities<'amend'>;
}
