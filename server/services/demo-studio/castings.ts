import type { CastingMethod } from '#shared/domain/casting/casting-method.ts';
import type { CastingState } from '#shared/domain/casting/casting-state.ts';

/** A flask of the demo studio: its number, diameter and height in mm. */
export const demoFlasks: readonly (readonly [number: number, diameterMm: number, heightMm: number])[] = [
  [88, 64, 64],
  [93, 102, 203],
  [97, 89, 102],
  [104, 64, 64],
  [110, 89, 102],
  [122, 64, 64],
  [138, 89, 102],
  [147, 89, 102],
  [150, 89, 102],
  [161, 89, 102],
  [170, 102, 203],
  [183, 64, 64],
];

/** A casting of the demo studio; `inMinutes` is its pour, from the moment the studio is made. */
export interface DemoCasting {
  readonly flask: number;
  readonly alloy: string;
  readonly method: CastingMethod;
  readonly state: CastingState;
  readonly stateReason?: string;
  readonly inMinutes: number;
  readonly bay: string;
  /** The sign-in name of whoever is to pour it. */
  readonly caster: string | null;
  readonly tree: {
    readonly number: number;
    readonly description: string;
    readonly waxMassG: number;
    readonly thinnestSectionMm: number;
    readonly pieces: number;
  };
  /** How the melt went, for those already poured. */
  readonly past?: {
    readonly by: string;
    readonly secondsToPour: number;
    readonly look: 'full' | 'misrun';
    readonly note: string;
  };
}

const tree = (
  number: number,
  description: string,
  waxMassG: number,
  thinnestSectionMm: number,
  pieces: number,
): DemoCasting['tree'] => ({ number, description, waxMassG, thinnestSectionMm, pieces });

const bay1 = 'furnace bay 1';
const bay2 = 'furnace bay 2';

/** A day's castings in several states, and some of the day before. */
export const demoCastings: readonly DemoCasting[] = [
  {
    flask: 97,
    alloy: 'sterling',
    method: 'vacuum',
    state: 'holding',
    inMinutes: -1560,
    bay: bay1,
    caster: 'ines',
    tree: tree(398, 'leaf ear studs', 7.9, 0.9, 34),
    past: { by: 'ines', secondsToPour: 31, look: 'full', note: '' },
  },
  {
    flask: 104,
    alloy: 'rose-18',
    method: 'vacuum',
    state: 'holding',
    inMinutes: -1490,
    bay: bay1,
    caster: 'tomas',
    tree: tree(399, 'knot rings', 3.1, 1.4, 6),
    past: { by: 'tomas', secondsToPour: 28, look: 'full', note: 'Clean skin. Quenched in time.' },
  },
  {
    flask: 183,
    alloy: 'yellow-14',
    method: 'centrifugal',
    state: 'holding',
    inMinutes: -1440,
    bay: bay2,
    caster: 'maren',
    tree: tree(401, 'seal rings, heavy', 5.6, 3.4, 3),
    past: { by: 'maren', secondsToPour: 26, look: 'full', note: '' },
  },
  {
    flask: 110,
    alloy: 'sterling',
    method: 'vacuum',
    state: 'holding',
    inMinutes: -130,
    bay: bay1,
    caster: 'ines',
    tree: tree(405, 'hammered cuffs', 9.8, 1.8, 7),
    past: { by: 'ines', secondsToPour: 33, look: 'full', note: '' },
  },
  {
    flask: 138,
    alloy: 'britannia',
    method: 'vacuum',
    state: 'holding',
    inMinutes: -75,
    bay: bay1,
    caster: 'tomas',
    tree: tree(406, 'filigree combs', 6.2, 0.8, 9),
    past: {
      by: 'tomas',
      secondsToPour: 92,
      look: 'misrun',
      note: 'Tongs slipped at the furnace door; two teeth short.',
    },
  },
  {
    flask: 147,
    alloy: 'yellow-18',
    method: 'vacuum',
    state: 'holding',
    inMinutes: 8,
    bay: bay1,
    caster: 'ines',
    tree: tree(416, 'wave rings', 4.75, 1.2, 8),
  },
  {
    flask: 122,
    alloy: 'rose-18',
    method: 'vacuum',
    state: 'holding',
    inMinutes: 33,
    bay: bay1,
    caster: 'ines',
    tree: tree(417, 'twisted bands', 3.5, 1.6, 5),
  },
  {
    flask: 150,
    alloy: 'sterling',
    method: 'vacuum',
    state: 'holding',
    inMinutes: 63,
    bay: bay1,
    caster: 'tomas',
    tree: tree(418, 'bead charms', 9.95, 1.1, 42),
  },
  {
    flask: 93,
    alloy: 'yellow-9',
    method: 'centrifugal',
    state: 'burning-out',
    inMinutes: 163,
    bay: bay2,
    caster: null,
    tree: tree(419, 'buckles', 11.2, 2.2, 12),
  },
  {
    flask: 161,
    alloy: 'sterling',
    method: 'vacuum',
    state: 'dewaxed',
    inMinutes: 208,
    bay: bay1,
    caster: null,
    tree: tree(420, 'pendant drops', 8.1, 1.5, 26),
  },
  {
    flask: 170,
    alloy: 'yellow-14',
    method: 'vacuum',
    state: 'invested',
    inMinutes: 290,
    bay: bay2,
    caster: null,
    tree: tree(421, 'hinged bangles', 12.4, 2, 4),
  },
  {
    flask: 88,
    alloy: 'yellow-18',
    method: 'vacuum',
    state: 'held',
    stateReason: 'Crack seen in the mould after burnout',
    inMinutes: 120,
    bay: bay2,
    caster: null,
    tree: tree(415, 'crown settings', 2.6, 0.8, 10),
  },
];
