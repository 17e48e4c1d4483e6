import type { Composition, ElementSymbol, SectionRequest } from '#shared/metallurgy/index.ts';

/** The section an alloy can be drawn in, with its place on the axis (wt% of the second element); or why there is none. */
export type SectionChoice =
  | { readonly request: SectionRequest; readonly x: number; readonly xElement: ElementSymbol }
  | { readonly request: null; readonly whyNone: string };

const modelElements: readonly ElementSymbol[] = ['Ag', 'Au', 'Cu', 'Zn'];
const heldInModel = (symbol: string): symbol is ElementSymbol =>
  (modelElements as readonly string[]).includes(symbol);

/**
 * Chooses the section: the binary system of an alloy of two metals, its main metal at the left; the carat section of
 * gold, silver and copper; none for anything else.
 */
export const sectionChoice = (compositionWt: Composition): SectionChoice => {
  const parts = Object.entries(compositionWt)
    .filter(([, wt]) => wt > 0)
    .toSorted(([, a], [, b]) => b - a);
  const elements = parts.map(([symbol]) => symbol).filter(heldInModel);
  const [first, second] = elements;
  if (elements.length !== parts.length) {
    return { request: null, whyNone: 'This alloy holds elements that the phase model does not.' };
  }
  if (!first || !second) {
    return { request: null, whyNone: 'A single metal has no section: it melts at one temperature.' };
  }
  if (elements.length === 2) {
    return {
      request: { kind: 'binary', elements: [first, second] },
      x: compositionWt[second] ?? 0,
      xElement: second,
    };
  }
  if (elements.length === 3 && !elements.includes('Zn')) {
    return {
      request: { kind: 'carat', goldWt: compositionWt['Au'] ?? 0 },
      x: compositionWt['Cu'] ?? 0,
      xElement: 'Cu',
    };
  }
  return {
    request: null,
    whyNone:
      'With zinc beside two other metals the phases lie off any flat section, so a drawn one would mislead. The freezing curve says the same in one line.',
  };
};
