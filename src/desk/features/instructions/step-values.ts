import type { AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';
import type { CastingMethod } from '#shared/domain/casting/casting-method.ts';
import type {
  Hazard,
  InstructionStep,
  Limits,
  SafetySign,
  StepKind,
  WorkerRole,
} from '#shared/domain/instruction/instruction-step.ts';
import type { CardStep } from '#shared/domain/pour-card/card-step.ts';
import { parseDecimal } from '#shared/lib/decimal.ts';
import { fromCelsius, fromGrams, toCelsius, toGrams, type Units } from '#shared/lib/units.ts';

/** A step as it is typed; what its kind does not ask for is kept, so that another kind can be tried and taken back. */
export interface StepValues {
  readonly key: string;
  readonly kind: StepKind;
  readonly before: CardStep;
  readonly sentence: string;
  readonly maySkip: boolean;
  readonly methods: CastingMethod[];
  readonly families: AlloyFamily[];
  readonly roles: WorkerRole[];
  readonly hazards: Hazard[];
  readonly sign: SafetySign | '';
  /** Limits in the studio's unit. */
  readonly low: string;
  readonly high: string;
  readonly seconds: string;
  readonly options: { readonly words: string; readonly isVariance: boolean }[];
  readonly act: string;
}

const randomMark = (): string =>
  Array.from(crypto.getRandomValues(new Uint8Array(4)), (byte) => byte.toString(16).padStart(2, '0')).join(
    '',
  );

/** A key that no other step has, ever. */
export const newKey = (kind: StepKind): string => `${kind}-${randomMark()}`;

/** A new step of a kind before a part of the card. */
export const emptyStep = (kind: StepKind, before: CardStep): StepValues => ({
  key: newKey(kind),
  kind,
  before,
  sentence: '',
  maySkip: kind === 'say',
  methods: [],
  families: [],
  roles: [],
  hazards: [],
  sign: '',
  low: '',
  high: '',
  seconds: '60',
  options: [
    { words: '', isVariance: false },
    { words: '', isVariance: true },
  ],
  act: '',
});

const round = (value: number, decimals: number): number => Number(value.toFixed(decimals));

const typed = (value: number | null, convert: (value: number) => number): string =>
  value === null ? '' : String(round(convert(value), 4));

const ownValues = (step: InstructionStep, { mass, temperature }: Units): Partial<StepValues> => {
  switch (step.kind) {
    case 'check':
      return { sign: step.sign ?? '' };
    case 'weigh': {
      const write = (value: number | null): string => typed(value, (grams) => fromGrams(grams, mass));
      return { low: write(step.limitsG.low), high: write(step.limitsG.high) };
    }
    case 'read': {
      const write = (value: number | null): string =>
        typed(value, (celsius) => fromCelsius(celsius, temperature));
      return { low: write(step.limitsC.low), high: write(step.limitsC.high) };
    }
    case 'wait':
      return { seconds: String(step.seconds) };
    case 'choose':
      return { options: step.options.map((option) => ({ ...option })) };
    case 'hold-to-act':
      return { act: step.act };
    default:
      return {};
  }
};

/** A step as its fields show it. */
export const valuesOfStep = (step: InstructionStep, units: Units): StepValues => ({
  ...emptyStep(step.kind, step.before),
  key: step.key,
  sentence: step.sentence,
  maySkip: step.maySkip,
  methods: [...step.when.methods],
  families: [...step.when.families],
  roles: [...step.when.roles],
  hazards: [...step.when.hazards],
  ...ownValues(step, units),
});

/** A step as it was read from its fields, and what in them is no number. */
export interface ReadStep {
  readonly step: InstructionStep;
  readonly faults: readonly { readonly field: 'low' | 'high' | 'seconds'; readonly message: string }[];
}

/** Reads the fields of a step; what is no number is left out and named. */
export const readStep = (values: StepValues, { mass, temperature }: Units): ReadStep => {
  const { key, kind, before, sentence, maySkip, methods, families, roles, hazards } = values;
  const base = { key, before, sentence, maySkip, when: { methods, families, roles, hazards } };
  const faults: { field: 'low' | 'high' | 'seconds'; message: string }[] = [];
  const number = (field: 'low' | 'high' | 'seconds', convert: (value: number) => number): number | null => {
    if (values[field].trim() === '' && field !== 'seconds') return null;
    const parsed = parseDecimal(values[field]);
    if (parsed.ok) return convert(parsed.value);
    faults.push({ field, message: parsed.error });
    return null;
  };
  const limits = (convert: (value: number) => number): Limits => ({
    low: number('low', convert),
    high: number('high', convert),
  });
  const own = (): InstructionStep => {
    switch (kind) {
      case 'check':
        return { ...base, kind, sign: values.sign === '' ? null : values.sign };
      case 'weigh':
        return { ...base, kind, limitsG: limits((value) => round(toGrams(value, mass), 4)) };
      case 'read':
        return { ...base, kind, limitsC: limits((value) => round(toCelsius(value, temperature), 2)) };
      case 'wait':
        return { ...base, kind, seconds: number('seconds', (value) => value) ?? 1 };
      case 'choose':
        return { ...base, kind, options: values.options };
      case 'hold-to-act':
        return { ...base, kind, act: values.act };
      default:
        return { ...base, kind };
    }
  };
  return { step: own(), faults };
};
