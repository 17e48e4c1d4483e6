import type { z } from 'zod';
import type { createRevisionRequest } from '#shared/contracts/alloy.ts';
import { markedMetal } from '#shared/domain/alloy/alloy-family.ts';
import { figuresOfComposition } from '#shared/domain/alloy/figures-of-composition.ts';
import { fieldError } from '../errors.ts';
import type { Alloy } from '../models/alloy.ts';
import type { AlloyRevision } from '../models/alloy-revision.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { lockRow } from './lock-row.ts';

type RevisionValues = z.output<typeof createRevisionRequest>;

const metalNames = { Ag: 'silver', Au: 'gold' } as const;

/** Fineness is never rounded up: a mark above what the composition holds is refused. */
const refuseHighMark = ({ family }: Alloy, { compositionWt, fineness }: RevisionValues): void => {
  const metal = markedMetal(family);
  const held = (compositionWt[metal] ?? 0) * 10;
  if (fineness <= held + 1e-9) return;
  throw fieldError(
    'fineness',
    `The composition holds ${held.toFixed(1)} parts per thousand of ${metalNames[metal]}; it cannot be marked ${fineness}.`,
  );
};

const refuseStrayTolerance = ({ compositionWt, toleranceWt }: RevisionValues): void => {
  const stray = Object.keys(toleranceWt).find((symbol) => !(symbol in compositionWt));
  if (stray)
    throw fieldError('toleranceWt', `There is a tolerance for ${stray}, which the alloy does not hold.`);
};

/** Writes a draft with the figures of today's engine; joins the caller's transaction. */
export const draftRevision = async (
  { models }: Services,
  { person }: SignedIn,
  alloy: Alloy,
  number: number,
  values: RevisionValues,
): Promise<AlloyRevision> => {
  refuseHighMark(alloy, values);
  refuseStrayTolerance(values);
  const outcome = figuresOfComposition(values.compositionWt, values.measured);
  if (!outcome.ok) {
    throw fieldError('measured', `${outcome.error} Enter the supplier’s measured range, with its source.`);
  }
  return models.AlloyRevision.create({
    ...values,
    ...outcome.value,
    alloyId: alloy.id,
    number,
    draftedBy: person.id,
  });
};

/** Adds a draft revision to an alloy; two drafts at once take turns. */
export const createRevision = (
  services: Services,
  actor: SignedIn,
  alloy: Alloy,
  values: RevisionValues,
): Promise<AlloyRevision> =>
  services.sequelize.transaction(async () => {
    await lockRow(alloy);
    const last = await services.models.AlloyRevision.max<number, AlloyRevision>('number', {
      where: { alloyId: alloy.id },
    });
    return draftRevision(services, actor, alloy, (last ?? 0) + 1, values);
  });
