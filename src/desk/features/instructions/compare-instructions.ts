import type { InstructionStep } from '#shared/domain/instruction/instruction-step.ts';
import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';
import { cardStepNames, cardSteps } from '#shared/domain/pour-card/card-step.ts';
import type { Units } from '#shared/lib/units.ts';
import { askWords, conditionWords, kindWords } from './step-words.ts';

/** One step that differs between two revisions, with what of it differs in plain words. */
export interface StepDifference {
  readonly key: string;
  readonly how: 'added' | 'removed' | 'changed';
  readonly step: InstructionStep;
  readonly changes: readonly string[];
}

/** Words of the instruction that differ. */
export interface TextDifference {
  readonly what: string;
  readonly before: string;
  readonly now: string;
}

/** What differs between two revisions of the work instruction. */
export interface InstructionDifferences {
  readonly steps: readonly StepDifference[];
  readonly texts: readonly TextDifference[];
}

const everywhere = 'everyone, everywhere';

const signOf = (step: InstructionStep): string =>
  step.kind === 'check' && step.sign !== null ? step.sign.replaceAll('-', ' ') : 'none';

const change = (what: string, before: string, now: string): readonly string[] =>
  before === now ? [] : [`${what}: “${now}”, before “${before}”.`];

const changesOf = (before: InstructionStep, now: InstructionStep, units: Units): readonly string[] => [
  ...change('Sentence', before.sentence, now.sentence),
  ...change('Kind', kindWords[before.kind].name, kindWords[now.kind].name),
  ...change('Part', cardStepNames[before.before], cardStepNames[now.before]),
  ...change('Asks', askWords(before, units) || 'nothing more', askWords(now, units) || 'nothing more'),
  ...change('Where', conditionWords(before.when) || everywhere, conditionWords(now.when) || everywhere),
  ...change('Sign', signOf(before), signOf(now)),
  ...(before.maySkip === now.maySkip
    ? []
    : [now.maySkip ? 'A caster may skip it now.' : 'Nobody may skip it any more.']),
];

/** The longest run of keys that keep their order; whatever is not in it has moved. */
const keptInOrder = (before: readonly string[], now: readonly string[]): ReadonlySet<string> => {
  const places = now.map((key) => before.indexOf(key));
  const best: number[][] = [];
  places.forEach((place, index) => {
    const ahead = best.filter((run) => (places[run.at(-1) ?? 0] ?? 0) < place);
    const longest = ahead.reduce<number[]>((found, run) => (run.length > found.length ? run : found), []);
    best[index] = [...longest, index];
  });
  const run = best.reduce<number[]>((found, each) => (each.length > found.length ? each : found), []);
  return new Set(run.flatMap((index) => now[index] ?? []));
};

const stepDifferences = (
  before: readonly InstructionStep[],
  now: readonly InstructionStep[],
  units: Units,
): readonly StepDifference[] => {
  const was = new Map(before.map((step) => [step.key, step]));
  const is = new Map(now.map((step) => [step.key, step]));
  const kept = keptInOrder(
    before.flatMap(({ key }) => (is.has(key) ? [key] : [])),
    now.flatMap(({ key }) => (was.has(key) ? [key] : [])),
  );
  const of = (step: InstructionStep): readonly StepDifference[] => {
    const { key } = step;
    const old = was.get(key);
    if (!old) return [{ key, how: 'added', step, changes: [] }];
    const moved = !kept.has(key) && old.before === step.before ? ['It stands at another place.'] : [];
    const changes = [...changesOf(old, step, units), ...moved];
    return changes.length > 0 ? [{ key, how: 'changed', step, changes }] : [];
  };
  const removed = before.filter(({ key }) => !is.has(key));
  return [
    ...now.flatMap(of),
    ...removed.map((step): StepDifference => ({ key: step.key, how: 'removed', step, changes: [] })),
  ];
};

const textsOf = (instruction: WorkInstruction): readonly (readonly [string, string])[] => [
  ['Title', instruction.title],
  ...cardSteps.map((part) => [`Sentence of ${cardStepNames[part]}`, instruction.sentences[part]] as const),
  ['When work is stopped', instruction.emergencyText],
  ['Who comes first', instruction.deference],
];

/** Compares two revisions: steps added, removed and changed by their keys, and the words around them. */
export const compareInstructions = (
  before: WorkInstruction,
  now: WorkInstruction,
  units: Units,
): InstructionDifferences => {
  const old = new Map(textsOf(before));
  return {
    steps: stepDifferences(before.steps, now.steps, units),
    texts: textsOf(now).flatMap(([what, text]) => {
      const was = old.get(what) ?? '';
      return was === text ? [] : [{ what, before: was, now: text }];
    }),
  };
};
