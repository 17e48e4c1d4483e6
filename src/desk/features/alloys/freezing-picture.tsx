import { useMemo } from 'react';
import type { MeltingRange } from '#shared/metallurgy/index.ts';
import { FreezingCurve, freezingFrame, freezingScales } from '#src/ui/freezing-curve.tsx';
import { handleRoom } from '#src/ui/section-diagram-frame.ts';
import type { StudioWriting } from '../../parts/use-studio.ts';
import type { FreezingStudy } from './alloy-study.ts';
import { temperatureTicks } from './axis-ticks.ts';
import { lastAtOnce, solidShareAt } from './freezing-readings.ts';
import { freezingSpan } from './temperature-span.ts';
import { TemperatureHandle } from './temperature-handle.tsx';
import type { TemperatureInAddress } from './use-temperature-in-address.ts';

/** Props of {@link FreezingPicture}. */
export interface FreezingPictureProps {
  readonly study: FreezingStudy;
  readonly range: MeltingRange;
  readonly width: number;
  readonly height: number;
  readonly studio: StudioWriting;
  /** Given where the picture is the page's main one: then the temperature is dragged in it. */
  readonly drag?: { readonly temperature: TemperatureInAddress; readonly spoken: string };
}

const labelOf = ({ lever, scheil }: FreezingStudy, { temperature }: StudioWriting): string => {
  const start = lever.points[0]?.temperatureC ?? 0;
  const atOnce = lastAtOnce(scheil.points);
  const end = (endsC: number | null): string =>
    endsC === null ? 'an end outside the model' : temperature(endsC);
  return `Freezing from ${temperature(start)}: slowly, all solid at ${end(lever.endsC)}; as cast, at ${end(scheil.endsC)}${
    atOnce > 0.01 ? `, where the last ${Math.round(atOnce * 100)} % freezes at once` : ''
  }. A table of it follows.`;
};

const Dots = ({
  study,
  atC,
  x,
  y,
}: { readonly study: FreezingStudy; readonly atC: number } & ReturnType<typeof freezingScales>) => (
  <>
    <circle
      cx={x(solidShareAt(study.lever.points, atC))}
      cy={y(atC)}
      r="8"
      className="fill-iron stroke-ground"
      strokeWidth="2.5"
    />
    <circle
      cx={x(solidShareAt(study.scheil.points, atC))}
      cy={y(atC)}
      r="8"
      className="fill-ember-fill stroke-ground"
      strokeWidth="2.5"
    />
  </>
);

/** The freezing curve of an alloy; as the page's main picture it also carries the temperature that is dragged. */
export const FreezingPicture = ({ study, range, width, height, studio, drag }: FreezingPictureProps) => {
  const span = useMemo(() => freezingSpan(range), [range]);
  const room = drag ? handleRoom : undefined;
  const frame = useMemo(() => freezingFrame(width, height, span, room), [width, height, span, room]);
  const ticks = useMemo(
    () => temperatureTicks(span, studio.units.temperature, height > 300 ? 7 : 4),
    [span, studio, height],
  );
  const label = useMemo(() => labelOf(study, studio), [study, studio]);
  const scales = freezingScales(frame);
  return (
    <div className="relative">
      <FreezingCurve
        frame={frame}
        lever={study.lever.points}
        scheil={study.scheil.points}
        ticks={ticks}
        label={label}
      />
      {drag ? (
        <TemperatureHandle frame={frame} scale={scales.y} span={span} studio={studio} {...drag}>
          <path
            d={`M${frame.left} ${scales.y(drag.temperature.atC)} H${frame.right}`}
            className="stroke-ink"
            strokeWidth="1.7"
            strokeDasharray="3 6"
          />
          <Dots study={study} atC={drag.temperature.atC} {...scales} />
        </TemperatureHandle>
      ) : null}
    </div>
  );
};
