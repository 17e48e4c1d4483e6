/** How a flask looks at a temperature: its body, its shaded edge and the investment at its top, as hex colours. */
export interface FlaskColours {
  readonly body: string;
  readonly edge: string;
  readonly top: string;
}

/** Ink of the figures on a flask, dark in both themes: it stands 7:1 on every body colour. */
export const flaskInk = '#150D09';

type Rgb = readonly [number, number, number];

interface Stop {
  readonly celsius: number;
  readonly body: Rgb;
  readonly edge: Rgb;
}

// A sign for heat, not a measured glow: plaster when cold, through straw to ember, kept light enough to write on.
const stops: readonly Stop[] = [
  { celsius: 20, body: [221, 214, 202], edge: [186, 176, 160] },
  { celsius: 200, body: [224, 196, 164], edge: [186, 150, 116] },
  { celsius: 400, body: [233, 167, 116], edge: [190, 116, 66] },
  { celsius: 600, body: [240, 140, 78], edge: [188, 84, 40] },
  { celsius: 800, body: [246, 142, 66], edge: [204, 74, 20] },
  { celsius: 1000, body: [252, 170, 84], edge: [222, 96, 24] },
];

const hex = (rgb: Rgb): string =>
  `#${rgb.map((part) => Math.round(part).toString(16).padStart(2, '0')).join('')}`;

const mix = (a: Rgb, b: Rgb, share: number): Rgb => [
  a[0] + (b[0] - a[0]) * share,
  a[1] + (b[1] - a[1]) * share,
  a[2] + (b[2] - a[2]) * share,
];

const plaster: Rgb = [246, 240, 230];

/** The colours of a flask at `celsius`, the coldest or the hottest beyond the ends of the scale. */
export const flaskColours = (celsius: number): FlaskColours => {
  const upper = stops.findIndex((stop) => stop.celsius >= celsius);
  const high = stops[upper === -1 ? stops.length - 1 : upper];
  const low = stops[upper === -1 ? stops.length - 1 : Math.max(0, upper - 1)];
  if (!high || !low) throw new RangeError('The flask colours have no stops.');
  const span = high.celsius - low.celsius;
  const share = span > 0 ? Math.max(0, (celsius - low.celsius) / span) : 0;
  const body = mix(low.body, high.body, share);
  return { body: hex(body), edge: hex(mix(low.edge, high.edge, share)), top: hex(mix(body, plaster, 0.45)) };
};
