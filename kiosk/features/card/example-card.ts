import type { AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';
import { figuresOfComposition, type MeasuredRange } from '#shared/domain/alloy/figures-of-composition.ts';
import type { QuenchRule } from '#shared/domain/alloy/quench-rule.ts';
import { belongsToWork } from '#shared/domain/instruction/step-applies.ts';
import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';
import { computeCardFigures } from '#shared/domain/pour-card/card-figures.ts';
import { defaultProcessTables } from '#shared/domain/studio/process-tables.ts';
import { defaultStudioLimits } from '#shared/domain/studio/studio-limits.ts';
import { buildCode, buildFlaskCode } from '#shared/lib/codes.ts';
import type { PreviewWork } from '#src/lib/preview-message.ts';
import type { RunningCard } from './use-running-card.ts';

interface ExampleAlloy {
  readonly name: string;
  readonly fineness: number;
  readonly compositionWt: Readonly<Record<string, number>>;
  readonly measured: MeasuredRange | null;
  readonly quench: QuenchRule;
}

const water: QuenchRule = {
  earliestS: 15 * 60,
  latestS: null,
  medium: 'water',
  why: 'Let the casting set through before the water.',
  source: 'Common practice, no source; the alloy’s own revision decides on a real card.',
};

/** Common trade compositions, wt%, as examples only. */
const alloys: Readonly<Record<AlloyFamily, ExampleAlloy>> = {
  silver: {
    name: 'Sterling',
    fineness: 925,
    compositionWt: { Ag: 92.5, Cu: 7.5 },
    measured: null,
    quench: water,
  },
  'yellow-gold': {
    name: '18 ct yellow',
    fineness: 750,
    compositionWt: { Au: 75, Ag: 12.5, Cu: 12.5 },
    measured: null,
    quench: water,
  },
  'rose-gold': {
    name: '18 ct rose',
    fineness: 750,
    compositionWt: { Au: 75, Ag: 4.5, Cu: 20.5 },
    measured: null,
    quench: {
      ...water,
      earliestS: 3 * 60,
      latestS: 5 * 60,
      medium: 'warm water',
      why: 'Quench hot: below about 410 °C gold and copper order, and the casting turns hard and brittle.',
    },
  },
  'white-gold': {
    name: '18 ct white',
    fineness: 750,
    compositionWt: { Au: 75, Ni: 8.5, Cu: 13, Zn: 3.5 },
    measured: {
      liquidusC: 955,
      solidusC: 895,
      densityGPerCm3: 14.76,
      source:
        'Liquidus and density: the gold industry’s published table of white golds. Solidus: not published; 60 °C below is assumed for this example.',
    },
    quench: water,
  },
};

const setUp = { sectionMm: 1.2, waxMassG: 5, flaskDiameterMm: 89, flaskHeightMm: 102, pieces: 8 } as const;

const contextOf = (work: PreviewWork, instruction: WorkInstruction, flaskCode: string) => {
  const example = alloys[work.family];
  const found = figuresOfComposition(example.compositionWt, example.measured);
  if (!found.ok) throw new Error(found.error);
  const figures = computeCardFigures({
    alloyName: example.name,
    family: work.family,
    alloy: found.value.figures,
    quench: example.quench,
    method: work.method,
    sectionMm: setUp.sectionMm,
    waxMassG: setUp.waxMassG,
    flaskDiameterMm: setUp.flaskDiameterMm,
    tables: defaultProcessTables,
  });
  return {
    rangeBasis: found.value.figures.basis,
    context: {
      figures,
      limits: defaultStudioLimits,
      plannedMetalG: Math.round(figures.metalWantedG * 100) / 100,
      rules: {
        steps: instruction.steps.filter((step) => belongsToWork(step, work)),
        flaskCode,
        countersignFactor: defaultStudioLimits.countersignFactor,
      },
      units: { temperature: 'C', mass: 'g' },
    },
  } as const;
};

/** A card of a flask that does not exist, with figures computed for a common alloy of the family. */
export const exampleCard = (work: PreviewWork, instruction: WorkInstruction): RunningCard['card'] => {
  const example = alloys[work.family];
  const flaskCode = buildFlaskCode(1);
  const now = new Date().toISOString();
  const { context, rangeBasis } = contextOf(work, instruction, flaskCode);
  return {
    casting: {
      id: 'example',
      flask: { code: flaskCode, diameterMm: setUp.flaskDiameterMm, heightMm: setUp.flaskHeightMm },
      tree: {
        code: buildCode('T', 1),
        waxMassG: setUp.waxMassG,
        thinnestSectionMm: setUp.sectionMm,
        pieces: setUp.pieces,
        description: 'example rings',
      },
      alloy: {
        id: 'example',
        name: example.name,
        family: work.family,
        fineness: example.fineness,
        revisionId: 'example',
        revision: 1,
      },
      method: work.method,
      state: 'holding',
      stateReason: '',
      plannedMetalG: context.plannedMetalG,
      plannedPourAt: now,
      bay: 'example bay',
      plannedBy: 'the preview',
      caster: null,
      melt: null,
      abilities: { move: false },
    },
    compositionWt: example.compositionWt,
    rangeBasis,
    context,
    instruction: { ...instruction, revision: 0 },
    melt: { id: 'example', code: 'M-example', openedBy: 'Practice', terminal: 'Practice' },
    events: [],
    abilities: { open: false, record: true },
    serverTime: now,
  };
};
