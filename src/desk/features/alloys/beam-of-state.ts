import type { ByElement, EquilibriumState, Phase } from '#shared/metallurgy/index.ts';
import { elementName } from './element-names.ts';
import { phaseWords } from './phase-words.ts';

/** One weight of the beam: what it is, its share of the mass, and its content of the balancing element in wt%. */
export interface BeamWeight {
  readonly words: string;
  readonly isLiquid: boolean;
  readonly massFraction: number;
  readonly wt: number;
}

/** Two weights balanced on the alloy's own content of one element. */
export interface BeamPair {
  readonly element: string;
  readonly alloyWt: number;
  readonly left: BeamWeight;
  readonly right: BeamWeight;
}

interface Side {
  readonly words: string;
  readonly isLiquid: boolean;
  readonly massFraction: number;
  readonly wt: ByElement;
}

const together = (phases: readonly Phase[], words: string): Side => {
  const massFraction = phases.reduce((sum, phase) => sum + phase.massFraction, 0);
  const share = (element: string): number =>
    phases.reduce((sum, phase) => sum + phase.massFraction * (phase.wt[element] ?? 0), 0) / massFraction;
  const elements = Object.keys(phases[0]?.wt ?? {});
  return { words, isLiquid: false, massFraction, wt: Object.fromEntries(elements.map((e) => [e, share(e)])) };
};

const single = (phase: Phase, words: string): Side => ({
  words,
  isLiquid: phase.name === 'liquid',
  massFraction: phase.massFraction,
  wt: phase.wt,
});

const sidesOf = ({ phases }: EquilibriumState): readonly [Side, Side] | null => {
  const solids = phases.filter(({ name }) => name !== 'liquid');
  const liquid = phases.find(({ name }) => name === 'liquid');
  const [first, second] = solids;
  if (liquid && first) return [together(solids, 'solid'), single(liquid, 'liquid')];
  if (!first || !second) return null;
  return [single(first, phaseWords(first)), single(second, phaseWords(second))];
};

/** The element whose content differs most between two sides: on it the beam is longest. */
const tellingElement = (left: ByElement, right: ByElement): string =>
  Object.keys(left).reduce((best, element) => {
    const apart = (symbol: string): number => Math.abs((right[symbol] ?? 0) - (left[symbol] ?? 0));
    return apart(element) > apart(best) + 1e-9 ? element : best;
  });

/** The lever rule of a state as a beam: solid against liquid, or one solid against the other; null for a single phase. */
export const beamOfState = (
  state: EquilibriumState,
  compositionWt: Readonly<Record<string, number>>,
): BeamPair | null => {
  const sides = sidesOf(state);
  if (!sides) return null;
  const [left, right] = sides;
  const minor = Object.keys(left.wt).toSorted((a, b) => (compositionWt[a] ?? 0) - (compositionWt[b] ?? 0));
  const symbol = tellingElement(
    Object.fromEntries(minor.map((element) => [element, left.wt[element] ?? 0])),
    right.wt,
  );
  const weigh = ({ words, isLiquid, massFraction, wt }: Side): BeamWeight => ({
    words,
    isLiquid,
    massFraction,
    wt: wt[symbol] ?? 0,
  });
  return {
    element: elementName(symbol),
    alloyWt: compositionWt[symbol] ?? 0,
    left: weigh(left),
    right: weigh(right),
  };
};
