import { z } from 'zod';
import { alloyFamilies, type AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';
import type { AlloyFigures } from '#shared/domain/alloy/alloy-figures.ts';
import type { QuenchRule } from '#shared/domain/alloy/quench-rule.ts';
import { exactWhole, isWhole, sumOfWt } from '#shared/lib/whole-range.ts';
import { temperatureC, words, type Abilities } from './common.ts';

const symbol = z.string().regex(/^[A-Z][a-z]?$/, 'Use element symbols, such as Ag.');
const percent = z.number().min(0, 'Not below 0.').max(100, 'Not above 100.');

const compositionWt = z
  .record(symbol, percent)
  .refine((wt) => Object.keys(wt).length > 0 && Object.keys(wt).length <= 12, 'Give one to twelve elements.')
  .refine((wt) => isWhole(sumOfWt(Object.values(wt)), exactWhole), {
    error: 'The parts must come to 100 wt%.',
  });

const quenchRule = z
  .object({
    earliestS: z.int().min(0, 'Not below 0.').max(7200, 'At most two hours.'),
    latestS: z.int().min(1).max(14_400, 'At most four hours.').nullable(),
    medium: z.enum(['water', 'warm water', 'air']),
    why: words(400, 'Say why this alloy is quenched then.'),
    source: words(400, 'Say where the rule comes from.'),
  })
  .refine(({ earliestS, latestS }) => latestS === null || latestS > earliestS, {
    error: 'The latest quench must come after the earliest.',
    path: ['latestS'],
  }) satisfies z.ZodType<QuenchRule>;

const measuredRange = z
  .object({
    solidusC: temperatureC,
    liquidusC: temperatureC,
    densityGPerCm3: z.number().min(5, 'Too light for a precious alloy.').max(23, 'Too heavy for any metal.'),
    source: words(400, 'Say whose measurement it is.'),
  })
  .refine(({ solidusC, liquidusC }) => solidusC <= liquidusC, {
    error: 'The liquidus cannot be below the solidus.',
    path: ['liquidusC'],
  });

const revision = z.object({
  compositionWt,
  /** Tolerance of each element, ± wt%. */
  toleranceWt: z
    .record(symbol, z.number().min(0).max(5, 'A tolerance of more than 5 % is no alloy.'))
    .default({}),
  fineness: z.int().min(1, 'Give the fineness in parts per thousand.').max(1000, 'Fineness ends at 1000.'),
  quench: quenchRule,
  /** The supplier's measured range, for an alloy that the model does not hold. */
  measured: measuredRange.nullable().default(null),
  note: z.string().trim().max(1000).default(''),
});

/** Adds an alloy with its first draft revision. */
export const createAlloyRequest = revision.extend({
  name: words(60, 'Name the alloy.'),
  family: z.enum(alloyFamilies),
});
/** Adds an alloy with its first draft revision. */
export type CreateAlloyRequest = z.input<typeof createAlloyRequest>;

/** Adds a draft revision to an alloy. */
export const createRevisionRequest = revision;
/** Adds a draft revision to an alloy. */
export type CreateRevisionRequest = z.input<typeof createRevisionRequest>;

/** Where a revision stands; an approved one is frozen with its figures. */
export type RevisionStatus = 'draft' | 'checked' | 'approved' | 'superseded';

/** One revision of an alloy. */
export interface AlloyRevision {
  readonly id: string;
  readonly number: number;
  readonly status: RevisionStatus;
  readonly compositionWt: Readonly<Record<string, number>>;
  readonly toleranceWt: Readonly<Record<string, number>>;
  readonly fineness: number;
  readonly figures: AlloyFigures;
  /** Why the figures are measured, not computed; empty when they are computed. */
  readonly outsideModel: string;
  /** What today's engine makes of it where that differs by more than 2 °C from the frozen figures; empty otherwise. */
  readonly drift: readonly string[];
  readonly quench: QuenchRule;
  readonly measured: z.infer<typeof measuredRange> | null;
  readonly note: string;
  readonly draftedBy: string;
  readonly checkedBy: string | null;
  readonly checkedAt: string | null;
  readonly approvedBy: string | null;
  readonly approvedAt: string | null;
  readonly abilities: Abilities<'check' | 'approve'>;
}

/** An alloy with all its revisions, newest first. */
export interface Alloy {
  readonly id: string;
  readonly name: string;
  readonly family: AlloyFamily;
  readonly revisions: readonly AlloyRevision[];
  readonly abilities: Abilities<'revise'>;
}
