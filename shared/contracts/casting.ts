import { z } from 'zod';
import type { AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';
import type { CastingMethod } from '#shared/domain/casting/casting-method.ts';
import { castingStates, needsReason, type CastingState } from '#shared/domain/casting/casting-state.ts';
import { optionalWords, type Abilities } from './common.ts';

/** Moves a casting to another state; held and scrapped want a reason. */
export const moveCastingRequest = z
  .object({ to: z.enum(castingStates), reason: optionalWords(500) })
  .refine(({ to, reason }) => !needsReason(to) || reason !== '', { error: 'Say why.', path: ['reason'] });
/** Moves a casting to another state. */
export type MoveCastingRequest = z.input<typeof moveCastingRequest>;

/** Which castings to list: those planned for one local day, or all still open. */
export const listCastingsQuery = z.object({
  on: z.iso
    .date('Write the day as year-month-day.')
    .refine((day) => day >= '2000-01-01' && day < '3000-01-01', 'Choose a day from the year 2000 on.')
    .optional(),
});

/** An alloy as castings and melts name it. */
export interface AlloyLabel {
  readonly id: string;
  readonly name: string;
  readonly family: AlloyFamily;
  readonly fineness: number;
  readonly revisionId: string;
  readonly revision: number;
}

/** One use of a flask. */
export interface Casting {
  readonly id: string;
  readonly flask: { readonly code: string; readonly diameterMm: number; readonly heightMm: number };
  readonly tree: {
    readonly code: string;
    readonly waxMassG: number;
    readonly thinnestSectionMm: number;
    readonly pieces: number;
    readonly description: string;
  };
  readonly alloy: AlloyLabel;
  readonly method: CastingMethod;
  readonly state: CastingState;
  readonly stateReason: string;
  readonly plannedMetalG: number;
  readonly plannedPourAt: string;
  readonly bay: string;
  readonly plannedBy: string;
  readonly caster: { readonly id: string; readonly name: string } | null;
  readonly melt: { readonly id: string; readonly code: string } | null;
  readonly abilities: Abilities<'move'>;
}
