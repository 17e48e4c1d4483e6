import { scaleLinear, type ScaleLinear } from 'd3-scale';

/** A place in a section: wt% of the axis' element, °C. */
export interface DiagramPoint {
  readonly x: number;
  readonly temperatureC: number;
}

/** Where the diagram stands in its picture, px. */
export interface DiagramFrame {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** The two scales of a diagram, from wt% and °C to px. */
export interface DiagramScales {
  readonly x: ScaleLinear<number, number>;
  readonly y: ScaleLinear<number, number>;
}

const narrowPx = 560;

/** Whether a picture of this width must do with smaller letters and fewer marks. */
export const isNarrow = ({ width }: DiagramFrame): boolean => width < narrowPx;

/** Room at the right of a plot for the temperature that is dragged, px. */
export const handleRoom = 72;

/** The frame of a picture `width` px wide: wider than tall on a desk, nearly square on a phone. */
export const diagramFrame = (width: number): DiagramFrame => {
  const isPhone = width < narrowPx;
  const height = Math.round(isPhone ? Math.max(340, width) : Math.min(660, width * 0.72));
  return { width, height, left: isPhone ? 42 : 52, right: width - handleRoom, top: 10, bottom: height - 56 };
};

/** Scales that fill a frame with `xMin`–`xMax` wt% and `lowC`–`highC` °C. */
export const diagramScales = (
  { left, right, top, bottom }: DiagramFrame,
  span: { readonly xMin: number; readonly xMax: number; readonly lowC: number; readonly highC: number },
): DiagramScales => ({
  x: scaleLinear([span.xMin, span.xMax], [left, right]),
  y: scaleLinear([span.lowC, span.highC], [bottom, top]),
});

/** An SVG path through points of a diagram. */
export const diagramPath = (points: readonly DiagramPoint[], { x, y }: DiagramScales): string =>
  points.map((p, k) => `${k === 0 ? 'M' : 'L'}${x(p.x).toFixed(1)} ${y(p.temperatureC).toFixed(1)}`).join('');
