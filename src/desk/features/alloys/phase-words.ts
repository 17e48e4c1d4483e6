import type { EquilibriumState, Phase } from '#shared/metallurgy/index.ts';
import { capitalised, elementName } from './element-names.ts';

const richest = (wt: Phase['wt']): string =>
  Object.entries(wt).reduce((best, part) => (part[1] > best[1] ? part : best))[0];

/** A phase in the trade's words: `liquid`, `silver-rich solid`. */
export const phaseWords = ({ name, wt }: Phase): string => {
  if (name === 'liquid') return 'liquid';
  if (name === 'silver-rich fcc') return 'silver-rich solid';
  if (name === 'copper-rich fcc') return 'copper-rich solid';
  const elements = Object.values(wt).filter((part) => part > 0).length;
  return elements === 1 ? 'solid' : `${elementName(richest(wt))}-rich solid`;
};

const joined = (words: readonly string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;

/** Which phases there are, in one sentence, solids first. */
export const phasesSentence = ({ phases }: EquilibriumState): string => {
  const solidsFirst = phases.toSorted((a, b) => Number(a.name === 'liquid') - Number(b.name === 'liquid'));
  if (phases.length === 1) return phases[0]?.name === 'liquid' ? 'All liquid.' : 'All solid, of one kind.';
  return `${capitalised(joined(solidsFirst.map(phaseWords)))}.`;
};

const numbers = ['no', 'one', 'two', 'three', 'four', 'five'] as const;
const inWords = (count: number): string => numbers[count] ?? String(count);
const counted = (count: number, one: string): string => `${inWords(count)} ${count === 1 ? one : `${one}s`}`;

const freedomWords = (free: number, phases: number, metals: number): string => {
  if (metals === 1) return 'the temperature alone';
  if (phases === 1) return `the temperature and ${counted(metals - 1, 'part')} of the composition`;
  if (free === 1) return 'set the temperature and every composition follows';
  return `set the temperature and ${counted(free - 1, 'part')} of one composition, and the rest follows`;
};

/** What the condensed phase rule, F = C + 1 − P, leaves free here, in one sentence. */
export const freedomSentence = ({
  phases,
  degreesOfFreedom,
  chemicalPotentials,
}: EquilibriumState): string => {
  const metals = Object.keys(chemicalPotentials).length;
  const start = capitalised(counted(phases.length, 'phase'));
  if (degreesOfFreedom === 0) {
    return `${start} of ${counted(metals, 'metal')}, so nothing is free: the temperature stands still until one of them is used up.`;
  }
  const things = `${counted(degreesOfFreedom, 'thing')} ${degreesOfFreedom === 1 ? 'is' : 'are'} free`;
  return `${start} of ${counted(metals, 'metal')}, so ${things}: ${freedomWords(degreesOfFreedom, phases.length, metals)}.`;
};
