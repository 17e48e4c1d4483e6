import { z } from 'zod';
import type { Contents } from '#shared/domain/metal/contents.ts';
import {
  metalPlaces,
  movementKinds,
  type MetalPlace,
  type MovementKind,
} from '#shared/domain/metal/ledger.ts';
import { massOrNoneG, words, type Abilities } from './common.ts';
import { countersign } from './lot.ts';

/** A page of movements, newest first; `before` is the id of the last one seen. */
export const listMovementsQuery = z.object({
  lotId: z.uuid().optional(),
  meltId: z.uuid().optional(),
  kind: z.enum(movementKinds).optional(),
  place: z.enum(metalPlaces).optional(),
  before: z
    .string()
    .regex(/^\d{1,18}$/)
    .optional(),
  limit: z.coerce.number().int().min(1).max(500).default(100),
});

/** Path parameter naming one movement. */
export const movementParams = z.object({
  id: z.string().regex(/^\d{1,18}$/, 'That is not a movement of ours.'),
});

/** Corrects a movement to what it should have been by a counter-movement; 0 undoes it. */
export const correctMovementRequest = z.object({
  key: z.uuid(),
  rightMassG: massOrNoneG,
  reason: words(500, 'Say what was wrong.'),
  countersign,
});
/** Corrects a movement. */
export type CorrectMovementRequest = z.input<typeof correctMovementRequest>;

/** One movement of metal. */
export interface Movement {
  readonly id: string;
  readonly kind: MovementKind;
  readonly from: MetalPlace;
  readonly to: MetalPlace;
  readonly massG: number;
  readonly contentsMg: Contents;
  readonly lot: { readonly id: string; readonly code: string; readonly name: string } | null;
  readonly melt: { readonly id: string; readonly code: string } | null;
  readonly reason: string;
  /** The movement it corrects. */
  readonly correctsId: string | null;
  readonly person: string;
  readonly countersignedBy: string | null;
  readonly terminal: string | null;
  readonly occurredAt: string;
  readonly recordedAt: string;
  readonly abilities: Abilities<'correct'>;
}

/** A page of movements. */
export interface MovementPage {
  readonly movements: readonly Movement[];
  readonly next: string | null;
}
