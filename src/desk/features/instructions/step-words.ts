import { alloyFamilyNames } from '#shared/domain/alloy/alloy-family.ts';
import { castingMethodNames } from '#shared/domain/casting/casting-method.ts';
import type {
  Hazard,
  InstructionStep,
  Limits,
  StepConditions,
  StepKind,
  WorkerRole,
} from '#shared/domain/instruction/instruction-step.ts';
import { formatClock, formatMass, formatTemperature, type Units } from '#shared/lib/units.ts';

/** What each kind of step is called, and what it asks for. */
export const kindWords: Readonly<Record<StepKind, { readonly name: string; readonly about: string }>> = {
  say: { name: 'Say', about: 'Words to read and touch.' },
  check: { name: 'Check', about: 'A point to check and touch, with a safety sign or without.' },
  weigh: { name: 'Weigh', about: 'A mass to write down. Outside its limits it is a variance.' },
  read: { name: 'Read', about: 'A temperature to write down. Outside its limits it is a variance.' },
  wait: { name: 'Wait', about: 'Time that must pass since the card came to this part.' },
  photograph: { name: 'Photograph', about: 'A picture by the terminal’s camera.' },
  scan: { name: 'Scan', about: 'The flask’s own code again, so that the right one is in hand.' },
  choose: { name: 'Choose', about: 'One of several answers; some of them may be a variance.' },
  countersign: { name: 'Countersign', about: 'A second person looks and signs with their PIN.' },
  'hold-to-act': { name: 'Hold to act', about: 'Something done, confirmed by a held touch.' },
};

/** A worker's role after “by”. */
export const roleNames: Readonly<Record<WorkerRole, string>> = {
  caster: 'a caster',
  apprentice: 'an apprentice',
};

/** A hazard as the metal it is. */
export const hazardNames: Readonly<Record<Hazard, string>> = {
  nickel: 'nickel',
  palladium: 'palladium',
  zinc: 'zinc',
};

const either = (words: readonly string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} or ${words.at(-1) ?? ''}`;

/** Where a step is asked, in words; empty when it is asked of everyone everywhere. */
export const conditionWords = ({ methods, families, roles, hazards }: StepConditions): string =>
  [
    methods.length > 0 && `in ${either(methods.map((method) => castingMethodNames[method]))} casting`,
    families.length > 0 && `for ${either(families.map((family) => alloyFamilyNames[family]))}`,
    hazards.length > 0 && `where the alloy holds ${either(hazards.map((hazard) => hazardNames[hazard]))}`,
    roles.length > 0 && `asked of ${either(roles.map((role) => roleNames[role]))}`,
  ]
    .filter(Boolean)
    .join(', ');

const limitWords = ({ low, high }: Limits, format: (value: number) => string): string => {
  if (low !== null && high !== null) return `between ${format(low)} and ${format(high)}`;
  if (low !== null) return `at least ${format(low)}`;
  return high === null ? '' : `at most ${format(high)}`;
};

/** What a step asks beside its sentence, in words; empty when its sentence is all. */
export const askWords = (step: InstructionStep, { mass, temperature }: Units): string => {
  switch (step.kind) {
    case 'weigh':
      return limitWords(step.limitsG, (grams) => formatMass(grams, mass));
    case 'read':
      return limitWords(step.limitsC, (celsius) => formatTemperature(celsius, temperature));
    case 'wait':
      return `at least ${formatClock(step.seconds)}`;
    case 'choose':
      return step.options
        .map(({ words, isVariance }) => `“${words}”${isVariance ? ' (a variance)' : ''}`)
        .join(', ');
    case 'hold-to-act':
      return `“${step.act}”`;
    default:
      return '';
  }
};
