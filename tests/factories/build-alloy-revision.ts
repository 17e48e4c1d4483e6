import type { CreationAttributes } from 'sequelize';
import type { AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';
import {
  figuresOfComposition,
  type FiguresOfComposition,
  type MeasuredRange,
} from '#shared/domain/alloy/figures-of-composition.ts';
import type { AlloyRevision } from '#server/models/alloy-revision.ts';
import type { Services } from '#server/services/services.ts';
import { buildUser } from './build-user.ts';
import { nextNumber } from './sequence.ts';

/** The wt% composition of every built alloy that is given no other: sterling. */
export const STERLING_WT = { Ag: 92.5, Cu: 7.5 };

const computed = new Map<string, FiguresOfComposition>();

/** The engine's figures, computed once for each composition. */
const figuresFor = (
  compositionWt: Readonly<Record<string, number>>,
  measured: MeasuredRange | null,
): FiguresOfComposition => {
  const key = JSON.stringify([compositionWt, measured]);
  const known = computed.get(key);
  if (known) return known;
  const outcome = figuresOfComposition(compositionWt, measured);
  if (!outcome.ok) throw new Error(outcome.error);
  computed.set(key, outcome.value);
  return outcome.value;
};

type Overrides = Partial<CreationAttributes<AlloyRevision>> & { readonly family?: AlloyFamily };

const approval = (overrides: Overrides, approvedBy: string): Partial<CreationAttributes<AlloyRevision>> => {
  const { status = 'approved' } = overrides;
  return status === 'approved' || status === 'superseded'
    ? { status, approvedBy, approvedAt: new Date('2026-11-01T09:00:00Z') }
    : { status };
};

/** Builds a revision of an alloy with the engine's own figures; approved sterling unless told otherwise. */
export const buildAlloyRevision = async (
  services: Services,
  { family = 'silver', ...overrides }: Overrides = {},
): Promise<AlloyRevision> => {
  const { models } = services;
  const compositionWt = overrides.compositionWt ?? STERLING_WT;
  const draftedBy = overrides.draftedBy ?? (await buildUser(services, { roles: ['owner'] })).id;
  const alloyId =
    overrides.alloyId ?? (await models.Alloy.create({ name: `Alloy ${nextNumber()}`, family })).id;
  return models.AlloyRevision.create({
    number: 1,
    compositionWt,
    fineness: 925,
    ...figuresFor(compositionWt, overrides.measured ?? null),
    // At once, so that a built card is quenched in time although its clock stands still.
    quench: { earliestS: 0, latestS: null, medium: 'water', why: 'Let it set through.', source: 'Test.' },
    measured: null,
    ...overrides,
    ...approval(overrides, draftedBy),
    alloyId,
    draftedBy,
  });
};
