import { useQuery } from '@tanstack/react-query';
import type { Alloy } from '#shared/contracts/alloy.ts';
import type { Casting } from '#shared/contracts/casting.ts';
import type { FlaskSizeCooling } from '#shared/contracts/flask-cooling.ts';
import type { Melt } from '#shared/contracts/melt.ts';
import type { Studio } from '#shared/contracts/studio.ts';
import { chooseCooling } from '#shared/domain/instrument/choose-cooling.ts';
import { computeCardFigures, type CardFigures } from '#shared/domain/pour-card/card-figures.ts';
import { isOver } from '#shared/domain/pour-card/card-state.ts';
import { alloysQuery } from '#src/api/alloys.ts';
import { flaskCoolingQuery } from '#src/api/flask-cooling.ts';
import { meltQuery } from '#src/api/melts.ts';
import { studioQuery } from '#src/api/studio.ts';
import { useDeskSession } from './desk-session.ts';

/** A casting's card figures, and whether they stand in the melt book or would hold if the card were opened now. */
export interface CastingFigures {
  readonly figures: CardFigures;
  readonly from: 'melt book' | 'today’s tables';
}

const ofToday = (
  casting: Casting,
  {
    alloys,
    studio,
    sizes,
  }: {
    readonly alloys: readonly Alloy[];
    readonly studio: Studio;
    readonly sizes: readonly FlaskSizeCooling[];
  },
): CastingFigures | null => {
  const { alloy, method, tree, flask } = casting;
  const revision = alloys
    .find(({ id }) => id === alloy.id)
    ?.revisions.find(({ id }) => id === alloy.revisionId);
  if (!revision) return null;
  const fit = sizes.find(({ diameterMm }) => diameterMm === flask.diameterMm)?.fit ?? null;
  const figures = computeCardFigures({
    alloyName: `${alloy.name}, revision ${alloy.revision}`,
    family: alloy.family,
    alloy: revision.figures,
    quench: revision.quench,
    method,
    sectionMm: tree.thinnestSectionMm,
    waxMassG: tree.waxMassG,
    flaskDiameterMm: flask.diameterMm,
    tables: studio.processTables,
    cooling: chooseCooling(flask.diameterMm, studio.processTables.flaskCooling, fit),
  });
  return { figures, from: 'today’s tables' };
};

const ofMelt = (casting: Casting, melt: Melt | undefined): CastingFigures | null =>
  melt && !(casting.state === 'holding' && isOver(melt.state))
    ? { figures: melt.context.figures, from: 'melt book' }
    : null;

/**
 * The figures of a casting's card: those fixed when its card was opened, else computed from the alloy revision and the
 * studio's tables as a terminal would; null while they are read, or when this person may not read the tables.
 */
export const useCastingFigures = (casting: Casting): CastingFigures | null => {
  const { abilities } = useDeskSession();
  const melt = useQuery({ ...meltQuery(casting.melt?.id ?? ''), enabled: casting.melt !== null });
  const alloys = useQuery(alloysQuery);
  const studio = useQuery({ ...studioQuery, enabled: abilities.editStudio });
  const cooling = useQuery({ ...flaskCoolingQuery, enabled: abilities.editStudio });
  if (casting.melt && melt.isPending) return null;
  const written = ofMelt(casting, melt.data);
  if (written) return written;
  return alloys.data && studio.data && cooling.data
    ? ofToday(casting, { alloys: alloys.data, studio: studio.data, sizes: cooling.data })
    : null;
};
