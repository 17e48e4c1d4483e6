import type { Assay, LotKind } from '#shared/domain/metal/lot.ts';

/** A lot of the demo studio; `daysAgo` is when it came, before the studio is made. */
export interface DemoLot extends Assay {
  readonly name: string;
  readonly kind: LotKind;
  /** The key of the alloy it is grain or returns of. */
  readonly alloy: string | null;
  readonly massG: number;
  readonly supplier: string;
  readonly reference: string;
  readonly place: string;
  readonly daysAgo: number;
  readonly quarantineReason?: string;
}

const refiner = 'A refiner in the valley';
const opening = 'Opening stock, weighed by two';
const safe = 'Safe, upper drawer';
const cupboard = 'Metal cupboard, bay 1';

/** Casting grain is bought a little above its mark, as house aim; the certificate's lower bound still holds it. */
const grain = (alloy: string, name: string, assay: Assay, massG: number, reference: string): DemoLot => ({
  name: `${name}, casting grain`,
  kind: 'grain',
  alloy,
  ...assay,
  massG,
  supplier: refiner,
  reference,
  place: cupboard,
  daysAgo: 19,
});

const returns = (alloy: string, name: string, assay: Assay, massG: number, daysAgo: number): DemoLot => ({
  name: `${name}, clean sprues and buttons`,
  kind: 'returns',
  alloy,
  ...assay,
  massG,
  supplier: opening,
  reference: '',
  place: 'Returns box, bay 1',
  daysAgo,
});

const sterling: Assay = { compositionWt: { Ag: 92.65, Cu: 7.35 }, toleranceWt: { Ag: 0.08, Cu: 0.08 } };
const britannia: Assay = { compositionWt: { Ag: 95.92, Cu: 4.08 }, toleranceWt: { Ag: 0.08, Cu: 0.08 } };
const yellow18: Assay = {
  compositionWt: { Au: 75.06, Ag: 12.5, Cu: 12.44 },
  toleranceWt: { Au: 0.04, Ag: 0.1, Cu: 0.1 },
};
const rose18: Assay = {
  compositionWt: { Au: 75.06, Ag: 4.5, Cu: 20.44 },
  toleranceWt: { Au: 0.04, Ag: 0.1, Cu: 0.1 },
};
const yellow14: Assay = {
  compositionWt: { Au: 58.57, Ag: 20.5, Cu: 20.93 },
  toleranceWt: { Au: 0.04, Ag: 0.1, Cu: 0.1 },
};
const yellow9: Assay = {
  compositionWt: { Au: 37.56, Ag: 10, Cu: 44.96, Zn: 7.48 },
  toleranceWt: { Au: 0.04, Ag: 0.1, Cu: 0.2, Zn: 0.2 },
};

/** What lay in the demo studio's safe and boxes three weeks ago: fine metal, grain, a master alloy, returns, one lot held back. */
export const demoLots: readonly DemoLot[] = [
  {
    name: 'Fine gold, granulated',
    kind: 'fine',
    alloy: null,
    compositionWt: { Au: 99.99 },
    toleranceWt: { Au: 0.005 },
    massG: 120,
    supplier: refiner,
    reference: 'V-2207',
    place: safe,
    daysAgo: 21,
  },
  {
    name: 'Fine silver, granulated',
    kind: 'fine',
    alloy: null,
    compositionWt: { Ag: 99.99 },
    toleranceWt: { Ag: 0.005 },
    massG: 600,
    supplier: refiner,
    reference: 'V-2208',
    place: safe,
    daysAgo: 21,
  },
  {
    name: 'Copper, oxygen-free rod',
    kind: 'fine',
    alloy: null,
    compositionWt: { Cu: 99.95 },
    toleranceWt: { Cu: 0.03 },
    massG: 500,
    supplier: 'A metal merchant by the canal',
    reference: '88-14',
    place: cupboard,
    daysAgo: 20,
  },
  {
    name: 'Master alloy for 18 ct yellow',
    kind: 'master',
    alloy: null,
    compositionWt: { Ag: 50, Cu: 50 },
    toleranceWt: { Ag: 0.3, Cu: 0.3 },
    massG: 150,
    supplier: refiner,
    reference: 'V-2213',
    place: cupboard,
    daysAgo: 20,
  },
  grain('sterling', 'Sterling', sterling, 700, 'V-2219'),
  grain('britannia', 'Britannia', britannia, 300, 'V-2220'),
  grain('yellow-18', '18 ct yellow', yellow18, 220, 'V-2221'),
  grain('rose-18', '18 ct rose', rose18, 200, 'V-2222'),
  grain('yellow-14', '14 ct yellow', yellow14, 320, 'V-2223'),
  grain('yellow-9', '9 ct yellow', yellow9, 250, 'V-2224'),
  returns('sterling', 'Sterling', sterling, 180, 18),
  returns('britannia', 'Britannia', britannia, 60, 17),
  returns('yellow-18', '18 ct yellow', yellow18, 46.5, 16),
  returns('rose-18', '18 ct rose', rose18, 38, 16),
  returns('yellow-14', '14 ct yellow', yellow14, 52.25, 15),
  {
    ...returns('sterling', 'Sterling, box without a label', sterling, 41.3, 12),
    quarantineReason: 'Found without a label: may hold solder. Wait for its assay.',
  },
  {
    name: 'Sweeps and spill, bay 2',
    kind: 'scrap',
    alloy: null,
    compositionWt: { Au: 30, Ag: 35, Cu: 35 },
    toleranceWt: { Au: 5, Ag: 5, Cu: 5 },
    massG: 22.8,
    supplier: opening,
    reference: '',
    place: 'Scrap tin, bay 2',
    daysAgo: 14,
  },
];
