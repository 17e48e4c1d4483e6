import { binarySection, equilibrium, freezingPath, meltingRange } from '#shared/metallurgy/index.ts';
import type {
  Composition,
  ElementSymbol,
  FreezingRule,
  Outcome,
  SectionRequest,
} from '#shared/metallurgy/index.ts';

const USAGE = `Usage: npm run --silent alloy -- COMMAND
  range   "Au 75 Ag 12.5 Cu 12.5"
  state   "Ag 92.5 Cu 7.5" 850
  path    "Ag 92.5 Cu 7.5" [--rule lever|scheil] [--step 5]
  section "Ag Cu"   or   section "Au 75"   (a carat section)
Compositions are in wt%; temperatures in °C.`;

/** A question that cannot be answered; its message is one sentence for the person who asked. */
class BadRequest extends Error {}

const readNumber = (text: string | undefined, what: string): number => {
  const value = Number(text?.replace(',', '.'));
  if (!text || !Number.isFinite(value))
    throw new BadRequest(`${what} must be a number, not ${JSON.stringify(text ?? '')}.`);
  return value;
};

const readComposition = (text: string | undefined): Composition => {
  const words = (text ?? '')
    .trim()
    .split(/[\s;]+/)
    .filter(Boolean);
  if (words.length === 0 || words.length % 2 !== 0) {
    throw new BadRequest('Write a composition as pairs of element and wt%, like "Ag 92.5 Cu 7.5".');
  }
  const composition: Record<string, number> = {};
  for (let k = 0; k < words.length; k += 2) {
    const element = words[k] ?? '';
    if (element in composition) throw new BadRequest(`${element} is given twice.`);
    composition[element] = readNumber(words[k + 1], `The amount of ${element}`);
  }
  return composition;
};

const readSection = (text: string | undefined): SectionRequest => {
  const [first, second, ...rest] = (text ?? '').trim().split(/[\s-]+/);
  if (!first || !second || rest.length > 0)
    throw new BadRequest('Name a section by two elements, like "Ag Cu", or "Au 75".');
  if (first === 'Au' && /^\d/.test(second))
    return { kind: 'carat', goldWt: readNumber(second, 'The gold of a section') };
  return { kind: 'binary', elements: [first as ElementSymbol, second as ElementSymbol] };
};

const readOptions = (words: readonly string[]): ReadonlyMap<string, string> => {
  const options = new Map<string, string>();
  for (let k = 0; k < words.length; k += 2) {
    const name = words[k] ?? '';
    if (name !== '--rule' && name !== '--step')
      throw new BadRequest(`${name} is not an option of this command.`);
    options.set(name, words[k + 1] ?? '');
  }
  return options;
};

const readRule = (text: string | undefined): FreezingRule => {
  if (text === undefined || text === 'lever') return 'lever';
  if (text === 'scheil') return 'scheil';
  throw new BadRequest('The rule must be lever or scheil.');
};

const answer = (command: string | undefined, words: readonly string[]): Outcome<object> => {
  const [subject, ...rest] = words;
  if (command === 'range') return meltingRange(readComposition(subject));
  if (command === 'state')
    return equilibrium(readComposition(subject), readNumber(rest[0], 'The temperature'));
  if (command === 'path') {
    const options = readOptions(rest);
    const step = options.get('--step');
    return freezingPath(readComposition(subject), {
      rule: readRule(options.get('--rule')),
      ...(step === undefined ? {} : { stepC: readNumber(step, 'The step') }),
    });
  }
  if (command === 'section') return binarySection(readSection(subject));
  throw new BadRequest(USAGE);
};

/** Refusals of the question itself; others are answers about the alloy and are printed as such. */
const FAULTS: ReadonlySet<string> = new Set([
  'composition-sum',
  'unknown-element',
  'negative',
  'not-a-number',
  'option',
]);

try {
  const [command, ...words] = process.argv.slice(2);
  const outcome = answer(command, words);
  if (!outcome.withinModel && FAULTS.has(outcome.code)) throw new BadRequest(outcome.reason);
  console.log(JSON.stringify(outcome.withinModel ? { ...outcome, reason: null } : outcome, null, 2));
} catch (error) {
  if (!(error instanceof BadRequest)) throw error;
  console.error(error.message);
  process.exitCode = 2;
}
