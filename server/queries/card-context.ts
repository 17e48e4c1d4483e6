import { markedMetal } from '#shared/domain/alloy/alloy-family.ts';
import { chooseCooling } from '#shared/domain/instrument/choose-cooling.ts';
import type { CoolingFit } from '#shared/domain/instrument/fit-flask-cooling.ts';
import { computeCardFigures } from '#shared/domain/pour-card/card-figures.ts';
import type { CardContext, ChargeAlloy } from '#shared/domain/pour-card/card-state.ts';
import type { StudioSettings } from '../models/studio-settings.ts';
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

/**
 * What a casting's card is judged against today: figures from its alloy revision, tree, flask and the studio's tables, and
 * how flasks of its size were seen to cool.
 */
export const cardContextOf = (
  casting: LoadedCasting,
  studio: StudioSettings,
  coolingFit: CoolingFit | null,
): CardContext => {
  const { alloyRevision, tree, flask, method } = casting;
  return {
    figures: computeCardFigures({
      alloyName: `${alloyRevision.alloy.name}, revision ${alloyRevision.number}`,
      family: alloyRevision.alloy.family,
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
    units: { temperature: studio.temperatureUnit, mass: studio.massUnit },
  };
};
