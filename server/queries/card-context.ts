import { markedMetal } from '#shared/domain/alloy/alloy-family.ts';
import { belongsToWork, hazardsOf } from '#shared/domain/instruction/step-applies.ts';
import { chooseCooling } from '#shared/domain/instrument/choose-cooling.ts';
import type { CoolingFit } from '#shared/domain/instrument/fit-flask-cooling.ts';
import { computeCardFigures } from '#shared/domain/pour-card/card-figures.ts';
import type { CardContext, ChargeAlloy } from '#shared/domain/pour-card/card-state.ts';
import type { StudioSettings } from '../models/studio-settings.ts';
import type { WorkInstructionRevision } from '../models/work-instruction-revision.ts';
import type { LoadedCasting } from './load-casting.ts';

/** What the metal of a charge of this alloy must come to. */
export const chargeAlloyOf = ({
  compositionWt,
  toleranceWt,
  fineness,
  alloy,
}: LoadedCasting['alloyRevision']): ChargeAlloy => ({
  compositionWt,
  toleranceWt,
  markedMetal: markedMetal(alloy.family),
  markPpt: fineness,
});

/** What a card is built from beside its casting: the instruction in force, and how flasks of its size were seen to cool. */
export interface CardGround {
  readonly instruction: WorkInstructionRevision;
  readonly coolingFit: CoolingFit | null;
}

/** What a casting's card is judged against today: figures from its alloy revision, tree, flask and the studio's tables. */
export const cardContextOf = (
  casting: LoadedCasting,
  studio: StudioSettings,
  { instruction: { content }, coolingFit }: CardGround,
): CardContext => {
  const { alloyRevision, tree, flask, method } = casting;
  const { family } = alloyRevision.alloy;
  const work = { method, family, hazards: hazardsOf(alloyRevision.compositionWt) };
  return {
    figures: computeCardFigures({
      alloyName: `${alloyRevision.alloy.name}, revision ${alloyRevision.number}`,
      family,
      alloy: alloyRevision.figures,
      quench: alloyRevision.quench,
      method,
      sectionMm: tree.thinnestSectionMm,
      waxMassG: tree.waxMassG,
      flaskDiameterMm: flask.diameterMm,
      tables: studio.processTables,
      cooling: chooseCooling(flask.diameterMm, studio.processTables.flaskCooling, coolingFit),
    }),
    limits: studio.limits,
    plannedMetalG: casting.plannedMetalG,
    alloy: chargeAlloyOf(alloyRevision),
    rules: {
      steps: content.steps.filter((step) => belongsToWork(step, work)),
      flaskCode: flask.code,
      countersignFactor: studio.limits.countersignFactor,
    },
    units: { temperature: studio.temperatureUnit, mass: studio.massUnit },
  };
};
