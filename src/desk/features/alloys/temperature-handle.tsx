import { useRef, type KeyboardEvent, type PointerEvent, type ReactNode } from 'react';
import type { StudioWriting } from '../../parts/use-studio.ts';
import { snapTemperature, temperatureAfterKey, writeDegrees } from './snap-temperature.ts';
import type { TemperatureSpan } from './temperature-span.ts';
import type { TemperatureInAddress } from './use-temperature-in-address.ts';

/** Props of {@link TemperatureHandle}; the frame in px, the scale from °C to px and back. */
export interface TemperatureHandleProps {
  readonly frame: {
    readonly width: number;
    readonly height: number;
    readonly left: number;
    readonly right: number;
    readonly top: number;
    readonly bottom: number;
  };
  readonly scale: { (celsius: number): number; invert: (px: number) => number };
  readonly span: TemperatureSpan;
  readonly temperature: TemperatureInAddress;
  readonly studio: StudioWriting;
  /** What stands at this temperature, for those who cannot see the picture. */
  readonly spoken: string;
  /** What the temperature draws over the picture. */
  readonly children: ReactNode;
}

const pill = { width: 64, height: 36 } as const;

/**
 * A layer over a picture with a temperature that is dragged, or moved by the keys: arrows one degree, with shift ten.
 * A picture may be touched to scroll the page; only the strip along the line takes hold of a finger.
 */
export const TemperatureHandle = (props: TemperatureHandleProps) => {
  const { frame, scale, span, temperature, studio, spoken, children } = props;
  const { atC, move, settle } = temperature;
  const unit = studio.units.temperature;
  const layer = useRef<SVGSVGElement>(null);
  const latest = useRef(atC);
  const isUnsettled = useRef(false);
  const y = scale(Math.min(span.highC, Math.max(span.lowC, atC)));

  const follow = ({ clientY }: PointerEvent): void => {
    const top = layer.current?.getBoundingClientRect().top ?? 0;
    latest.current = snapTemperature(scale.invert(clientY - top), span, unit);
    move(latest.current);
  };
  const take = (event: PointerEvent<SVGElement>): void => {
    if (event.button !== 0) return;
    event.preventDefault();
    event.currentTarget.setPointerCapture(event.pointerId);
    layer.current?.querySelector<SVGGElement>('[role="slider"]')?.focus({ preventScroll: true });
    follow(event);
  };
  const drag = (event: PointerEvent<SVGElement>): void => {
    if (event.currentTarget.hasPointerCapture(event.pointerId)) follow(event);
  };
  const release = (event: PointerEvent<SVGElement>): void => {
    if (event.currentTarget.hasPointerCapture(event.pointerId)) settle(latest.current);
  };
  const press = (event: KeyboardEvent): void => {
    const next = temperatureAfterKey(atC, event, span, unit);
    if (next === null) return;
    event.preventDefault();
    isUnsettled.current = true;
    move(next);
  };
  const rest = (): void => {
    if (isUnsettled.current) settle(atC);
    isUnsettled.current = false;
  };
  const grip = { onPointerDown: take, onPointerMove: drag, onPointerUp: release } as const;
  const { left, right, top, bottom } = frame;
  return (
    <svg
      ref={layer}
      width={frame.width}
      height={frame.height}
      className="absolute inset-0 select-none"
      data-part="temperature-layer"
    >
      <rect
        x={left}
        y={top}
        width={right - left}
        height={bottom - top}
        fill="transparent"
        className="cursor-ns-resize"
        {...grip}
      />
      <g className="pointer-events-none">{children}</g>
      <rect
        x={left}
        y={y - 24}
        width={frame.width - left}
        height="48"
        fill="transparent"
        className="cursor-ns-resize touch-none"
        {...grip}
      />
      <g
        role="slider"
        tabIndex={0}
        aria-label="Temperature"
        aria-orientation="vertical"
        aria-valuemin={Math.round(span.lowC)}
        aria-valuemax={Math.round(span.highC)}
        aria-valuenow={Math.round(atC)}
        aria-valuetext={`${writeDegrees(atC, unit)} °${unit}. ${spoken}`}
        onKeyDown={press}
        onKeyUp={rest}
        onBlur={rest}
        className="pointer-events-none outline-offset-2"
        style={{ transform: `translate(${right + 6}px, ${y - pill.height / 2}px)` }}
      >
        <rect {...pill} rx={pill.height / 2} className="fill-ink" />
        <path
          d="M10 15 l4 -5 4 5 M10 21 l4 5 4 -5"
          fill="none"
          className="stroke-ground"
          strokeWidth="2.4"
          strokeLinecap="round"
          strokeLinejoin="round"
        />
        <text
          x="40"
          y={pill.height / 2}
          textAnchor="middle"
          dominantBaseline="central"
          className="fill-ground text-[16px] font-black"
        >
          {writeDegrees(atC, unit)}
        </text>
      </g>
    </svg>
  );
};
