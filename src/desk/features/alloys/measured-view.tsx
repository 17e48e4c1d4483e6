import type { AlloyRevision } from '#shared/contracts/alloy.ts';
import { Notice } from '#src/ui/notice.tsx';
import { TemperatureColumn } from '#src/ui/temperature-column.tsx';
import type { StudioWriting } from '../../parts/use-studio.ts';
import { MeltingRows } from './melting-rows.tsx';

const roomC = 60;

/** A revision outside the model: the measured range as it was entered, with its source and without any share of solid. */
export const MeasuredView = ({
  revision,
  studio,
}: {
  readonly revision: AlloyRevision;
  readonly studio: StudioWriting;
}) => {
  const { figures, outsideModel } = revision;
  const { solidusC, liquidusC } = figures;
  return (
    <div className="grid items-start gap-x-14 gap-y-6 md:grid-cols-[auto_minmax(0,1fr)]">
      <TemperatureColumn
        solidusC={solidusC}
        liquidusC={liquidusC}
        windowC={null}
        rangeC={{ low: solidusC - roomC, high: liquidusC + roomC }}
        readingC={null}
        format={studio.degrees}
        unit={`°${studio.units.temperature}`}
      />
      <div className="grid max-w-[640px] gap-5">
        <Notice kind="caution" title="Measured range, not computed">
          <p>{outsideModel}</p>
          <p className="pt-2">
            No diagram, no freezing curve and no share of solid are shown: between{' '}
            {studio.temperature(solidusC)} and {studio.temperature(liquidusC)} part of it is solid, and how
            much is not known.
          </p>
        </Notice>
        <MeltingRows figures={figures} band={null} toleranceWords="" lastAtOnce={null} studio={studio} />
        <p className="text-soft">
          <span className="font-extrabold">Source: </span>
          {figures.source}
        </p>
      </div>
    </div>
  );
};
