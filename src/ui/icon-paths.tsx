import type { ReactNode } from 'react';

const padDots = [8, 20, 32].flatMap((y) =>
  [8, 20, 32].map((x) => (
    <circle key={`${x}-${y}`} cx={x} cy={y} r="4.4" fill="currentColor" stroke="none" />
  )),
);

const paths = {
  pad: <>{padDots}</>,
  scan: <path d="M4 13V4h9M27 4h9v9M36 27v9h-9M13 36H4v-9M13 20h14" />,
  pedal: <path d="M4 34h32M7 34l4-7h18l7-13M11 27l-4-4" />,
  glove: (
    <path d="M12 25V13a3 3 0 0 1 6 0V7a3 3 0 0 1 6 0v3a3 3 0 0 1 6 0v14c0 3-2 5-2 8H15c0-3-2-4-4-7l-5-6c-1.5-3 2-5 4-3l2 3M14 37h15" />
  ),
  'face-shield': <path d="M8 14a12 12 0 0 1 24 0M6 14h28M9 14v10c0 7 5 12 11 12s11-5 11-12V14M15 22h10" />,
  drop: <path d="M20 4c6 8 11 13 11 20a11 11 0 0 1-22 0c0-7 5-12 11-20zM15 25c0 3 2 5 5 5" />,
  tongs: <path d="M13 4c-5 5-4 11 1 15l15 18M27 4c5 5 4 11-1 15L11 37M20 26v.01" />,
  clock: (
    <>
      <circle cx="20" cy="20" r="15.5" />
      <path d="M20 11v9l6 4" />
    </>
  ),
  camera: (
    <>
      <path d="M4 13h7l3-5h12l3 5h7v20H4z" />
      <circle cx="20" cy="22" r="6" />
    </>
  ),
  scale: <path d="M5 34h30M10 34l2-12h16l2 12M8 14h24M20 14v8M17 28h6" />,
  thermometer: <path d="M15 24V8a5 5 0 0 1 10 0v16a8 8 0 1 1-10 0zM20 16v14" />,
  erase: <path d="M13 8h22v24H13L3 20zM18 15l10 10M28 15 18 25" />,
  tick: <path d="m6 21 9 9 19-20" />,
  cross: <path d="m9 9 22 22M31 9 9 31" />,
  plus: <path d="M20 6v28M6 20h28" />,
  search: (
    <>
      <circle cx="17" cy="17" r="11.5" />
      <path d="m26 26 9 9" />
    </>
  ),
  up: <path d="M20 34V7M8 18 20 6l12 12" />,
  down: <path d="M20 6v27M8 22l12 12 12-12" />,
  'up-down': <path d="m12 15 8-8 8 8M12 25l8 8 8-8" />,
  back: <path d="M34 20H7M18 8 6 20l12 12" />,
  forward: <path d="M6 20h27M22 8l12 12-12 12" />,
  day: (
    <>
      <circle cx="20" cy="20" r="7" />
      <path d="M20 3v4M20 33v4M3 20h4M33 20h4M8 8l2.5 2.5M29.5 29.5 32 32M32 8l-2.5 2.5M10.5 29.5 8 32" />
    </>
  ),
  'melt-room': <path d="M33 24A14 14 0 1 1 16 7a11 11 0 0 0 17 17z" />,
  person: (
    <>
      <circle cx="20" cy="13" r="7" />
      <path d="M6 35c1-8 7-11 14-11s13 3 14 11" />
    </>
  ),
  people: (
    <>
      <circle cx="14" cy="14" r="6" />
      <path d="M3 33c1-7 5-10 11-10s10 3 11 10M26 9a6 6 0 0 1 0 11M30 25c4 1 6 4 7 8" />
    </>
  ),
  lock: <path d="M8 18h24v16H8zM13 18v-5a7 7 0 0 1 14 0v5M20 24v4" />,
  print: <path d="M11 15V4h18v11M11 29H5V15h30v14h-6M11 24h18v12H11z" />,
  note: <path d="M8 4h18l7 7v25H8zM14 17h13M14 24h13M14 31h7" />,
  network: <path d="M4 15c10-9 22-9 32 0M10 22c6-5 14-5 20 0M16 29c2.5-2 5.5-2 8 0M20 34.5v.01" />,
  'no-network': <path d="M4 15c10-9 22-9 32 0M13 23l14 13M27 23 13 36" />,
  sound: <path d="M5 15h7l9-8v26l-9-8H5zM27 14c3 4 3 8 0 12M32 9c6 7 6 15 0 22" />,
  'no-sound': <path d="M5 15h7l9-8v26l-9-8H5zM27 15l9 10M36 15l-9 10" />,
} satisfies Readonly<Record<string, ReactNode>>;

/** The names of the small pictures. */
export type IconName = keyof typeof paths;

/** Drawings of the small pictures on a 40 × 40 ground, stroked in the current colour. */
export const iconPaths: Readonly<Record<IconName, ReactNode>> = paths;
