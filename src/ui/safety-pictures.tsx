import type { ReactNode } from 'react';

/** The safety signs we draw. */
export type SafetySignName =
  | 'face-shield'
  | 'heat-gloves'
  | 'apron'
  | 'closed-shoes'
  | 'shaded-glasses'
  | 'ventilation'
  | 'dry-charge'
  | 'hot-surface'
  | 'steam'
  | 'nickel';

/** A sign's shape by ISO 3864, its name, and its picture around the origin of a 128 × 128 ground. */
export interface SafetyPicture {
  readonly kind: 'mandatory' | 'warning';
  readonly name: string;
  readonly picture: ReactNode;
}

const steamPath = 'c-6 -6 6 -9 0 -16 c-6 -7 6 -9 0 -16';

/** Pictures of our own; `currentColor` is the sign's ground, for what is cut out of a picture. */
export const safetyPictures: Readonly<Record<SafetySignName, SafetyPicture>> = {
  'face-shield': {
    kind: 'mandatory',
    name: 'Wear a face shield',
    picture: (
      <>
        <path d="M-24 -14 C-24 -50 24 -50 24 -14 L22 12 C20 30 9 38 0 38 C-9 38 -20 30 -22 12 Z" />
        <path d="M-30 -16 H30 V-7 H-30 Z" />
        <path
          d="M-22 -1 H22 V15 C20 26 11 31 0 31 C-11 31 -20 26 -22 15 Z"
          fill="currentColor"
          stroke="none"
        />
        <path d="M-12 18 L4 4 M0 24 L15 10" fill="none" strokeWidth="4" />
      </>
    ),
  },
  'heat-gloves': {
    kind: 'mandatory',
    name: 'Wear heat-resistant gloves',
    picture: (
      <>
        <path d="M-15 14 V-30 a7 7 0 0 1 14 0 V-36 a7 7 0 0 1 14 0 V-28 a6.5 6.5 0 0 1 13 0 V10 C26 18 21 20 21 26 H-14 C-14 18 -22 12 -27 4 L-36 -10 C-40 -18 -29 -24 -24 -17 L-15 -5" />
        <path d="M-1 -28 V-8 M13 -26 V-8" fill="none" stroke="currentColor" strokeWidth="3.5" />
        <path d="M-17 32 H24 V42 H-17 Z" />
      </>
    ),
  },
  apron: {
    kind: 'mandatory',
    name: 'Wear a heat-resistant apron and natural-fibre clothes',
    picture: (
      <>
        <path d="M-13 -26 C-13 -46 13 -46 13 -26" fill="none" />
        <path d="M-13 -26 H13 L15 -8 C18 -2 24 0 27 2 V38 H-27 V2 C-24 0 -18 -2 -15 -8 Z" />
        <path d="M-27 6 H-37 M27 6 H37" fill="none" />
        <path d="M-13 13 H13 V26 H-13 Z" fill="none" stroke="currentColor" strokeWidth="4" />
      </>
    ),
  },
  'closed-shoes': {
    kind: 'mandatory',
    name: 'Wear closed shoes',
    picture: (
      <>
        <path d="M-32 -28 H-6 V-8 C2 2 16 2 28 8 C36 12 38 18 38 22 H-34 Z" />
        <path d="M-35 29 H39 V35 H-35 Z" />
        <path d="M-4 -4 L6 -9 M4 3 L13 -2" fill="none" stroke="currentColor" strokeWidth="4" />
      </>
    ),
  },
  'shaded-glasses': {
    kind: 'mandatory',
    name: 'Wear shaded glasses to look into the melt',
    picture: (
      <>
        <path d="M-40 -10 H40 V-4 H-40 Z" strokeWidth="3" />
        <path d="M-38 -6 H-5 V4 C-5 18 -14 22 -21 22 C-30 22 -38 16 -38 4 Z" />
        <path d="M38 -6 H5 V4 C5 18 14 22 21 22 C30 22 38 16 38 4 Z" />
        <path
          d="M-31 6 L-20 -2 M-27 13 L-13 2 M12 6 L23 -2 M16 13 L30 2"
          stroke="currentColor"
          strokeWidth="3.5"
        />
      </>
    ),
  },
  ventilation: {
    kind: 'mandatory',
    name: 'Run the ventilation',
    picture: (
      <>
        <path d="M-34 -36 H34 L16 -18 H-16 Z" />
        <path d="M0 -50 V-38" fill="none" strokeWidth="14" strokeLinecap="butt" />
        {[-13, 13].map((x) => (
          <path
            key={x}
            d={`M${x} 36 C${x - 8} 26 ${x + 8} 18 ${x} 8 V-4 M${x - 7} 3 L${x} -5 L${x + 7} 3`}
            fill="none"
          />
        ))}
      </>
    ),
  },
  'dry-charge': {
    kind: 'warning',
    name: 'Moisture and molten metal explode: charge, crucible and tools must be dry',
    picture: (
      <>
        <path d="M0 -25 C6 -17 10 -12 10 -5 A10 10 0 0 1 -10 -5 C-10 -12 -6 -17 0 -25 Z" strokeWidth="1" />
        <path d="M-25 34 H25 L22 40 H-22 Z" strokeWidth="3" />
        <path
          d="M0 30 V14 M-10 29 L-21 15 M10 29 L21 15 M-18 31 L-30 27 M18 31 L30 27"
          fill="none"
          strokeWidth="4.5"
        />
      </>
    ),
  },
  'hot-surface': {
    kind: 'warning',
    name: 'Hot surface: a hot flask looks like a cold one',
    picture: (
      <>
        <path d="M-19 15 V33 C-19 40 19 40 19 33 V15" strokeWidth="3" />
        <ellipse cy="14" rx="19" ry="5.5" strokeWidth="3" />
        <ellipse cy="14" rx="6" ry="1.8" fill="currentColor" stroke="none" />
        {[-9, 0, 9].map((x) => (
          <path
            key={x}
            d={`M${x} ${x === 0 ? 2 : 3} c-4 -4 4 -6 0 -10 c-3 -4 3 -5 0 -8`}
            fill="none"
            strokeWidth="4"
          />
        ))}
      </>
    ),
  },
  steam: {
    kind: 'warning',
    name: 'Steam at the quench: stand back, tongs and face shield',
    picture: (
      <>
        <path d="M-27 20 H27 L23 39 H-23 Z" strokeWidth="3" />
        <path
          d="M-20 27 c5 -4 8 4 13 0 s8 4 13 0 s8 4 13 0"
          fill="none"
          stroke="currentColor"
          strokeWidth="3"
        />
        {[-13, 0, 13].map((x) => (
          <path
            key={x}
            d={`M${x} 12 ${x === 0 ? steamPath : 'c-5 -5 5 -7 0 -12 c-4 -5 4 -6 0 -9'}`}
            fill="none"
            strokeWidth="4.5"
          />
        ))}
      </>
    ),
  },
  nickel: {
    kind: 'warning',
    name: 'Nickel alloy: may cause sensitisation',
    picture: <path d="M-21 36 V4 L-3 36 V4 M13 13 V36 M13 3 v.01" fill="none" strokeWidth="7" />,
  },
};
