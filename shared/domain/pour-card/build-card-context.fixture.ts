import { defaultProcessTables } from '../studio/process-tables.ts';
import { defaultStudioLimits } from '../studio/studio-limits.ts';
import { computeCardFigures, type CardFiguresInput } from './card-figures.ts';
import type { CardContext } from './card-state.ts';

/** An 18 ct yellow card on vacuum for unit tests; figures are a plausible alloy's, not a published one's. */
export const cardFiguresInput: CardFiguresInput = {
  alloyName: '18 ct yellow',
  family: 'yellow-gold',
  alloy: {
    liquidusC: 895,
    solidusC: 885,
    asCastSolidusC: 870,
    solvusC: null,
    densityGPerCm3: 15.45,
    basis: 'measured',
    source: 'test',
    engineVersion: null,
  },
  quench: { earliestS: 720, latestS: null, medium: 'water', why: 'Let it set.', source: 'test' },
  method: 'vacuum',
  sectionMm: 1.2,
  waxMassG: 5,
  flaskDiameterMm: 89,
  tables: defaultProcessTables,
};

/** Builds a card's context for unit tests, 84.20 g planned. */
export const buildCardContext = (overrides: Partial<CardContext> = {}): CardContext => ({
  figures: computeCardFigures(cardFiguresInput),
  limits: defaultStudioLimits,
  plannedMetalG: 84.2,
  units: { temperature: 'C', mass: 'g' },
  ...overrides,
});
