import type { AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';
import type { QuenchRule } from '#shared/domain/alloy/quench-rule.ts';

/** An alloy of the demo studio. */
export interface DemoAlloy {
  readonly key: string;
  readonly name: string;
  readonly family: AlloyFamily;
  readonly fineness: number;
  readonly compositionWt: Readonly<Record<string, number>>;
  readonly toleranceWt: Readonly<Record<string, number>>;
  readonly quench: QuenchRule;
}

const minutes = (count: number): number => count * 60;

const goldQuench: QuenchRule = {
  earliestS: minutes(12),
  latestS: null,
  medium: 'water',
  why: 'Let the casting set through before the water: too soon and it may crack.',
  source:
    'A practitioner’s figure for general gold, 12 to 15 minutes; check it against the alloy supplier’s sheet.',
};

/** Two silver and four gold alloys; compositions after common trade alloys, quench rules with their sources. */
export const demoAlloys: readonly DemoAlloy[] = [
  {
    key: 'sterling',
    name: 'Sterling, plain',
    family: 'silver',
    fineness: 925,
    compositionWt: { Ag: 92.5, Cu: 7.5 },
    toleranceWt: { Ag: 0.3, Cu: 0.3 },
    quench: {
      earliestS: minutes(15),
      latestS: null,
      medium: 'water',
      why: 'Stands until it is set through; quenched earlier it is softer but may crack, later it is harder.',
      source:
        'A supplier’s bench guide for large flasks, 15 to 20 minutes; small flasks are quenched sooner.',
    },
  },
  {
    key: 'britannia',
    name: 'Britannia',
    family: 'silver',
    fineness: 958,
    compositionWt: { Ag: 95.8, Cu: 4.2 },
    toleranceWt: { Ag: 0.2, Cu: 0.2 },
    quench: {
      earliestS: minutes(15),
      latestS: null,
      medium: 'water',
      why: 'Stands until it is set through.',
      source: 'Taken over from sterling; common practice, no source.',
    },
  },
  {
    key: 'yellow-18',
    name: '18 ct yellow',
    family: 'yellow-gold',
    fineness: 750,
    compositionWt: { Au: 75, Ag: 12.5, Cu: 12.5 },
    toleranceWt: { Au: 0.1, Ag: 0.3, Cu: 0.3 },
    quench: {
      ...goldQuench,
      earliestS: minutes(20),
      source: 'An alloy supplier’s page for 18 ct yellow casting, 20 minutes; 60 with set stones.',
    },
  },
  {
    key: 'rose-18',
    name: '18 ct rose',
    family: 'rose-gold',
    fineness: 750,
    compositionWt: { Au: 75, Ag: 4.5, Cu: 20.5 },
    toleranceWt: { Au: 0.1, Ag: 0.2, Cu: 0.3 },
    quench: {
      earliestS: minutes(3),
      latestS: minutes(5),
      medium: 'warm water',
      why: 'Quench hot: below about 410 °C gold and copper order, and slow-cooled rose gold turns hard and brittle.',
      source:
        'Ordering temperature: Okamoto et al. 1987. Latest time: computed estimate for a 64 mm flask passing 410 °C; replace it by a trial.',
    },
  },
  {
    key: 'yellow-14',
    name: '14 ct yellow',
    family: 'yellow-gold',
    fineness: 585,
    compositionWt: { Au: 58.5, Ag: 20.5, Cu: 21 },
    toleranceWt: { Au: 0.1, Ag: 0.3, Cu: 0.3 },
    quench: goldQuench,
  },
  {
    key: 'yellow-9',
    name: '9 ct yellow',
    family: 'yellow-gold',
    fineness: 375,
    compositionWt: { Au: 37.5, Ag: 10, Cu: 45, Zn: 7.5 },
    toleranceWt: { Au: 0.1, Ag: 0.3, Cu: 0.4, Zn: 0.3 },
    quench: goldQuench,
  },
];
