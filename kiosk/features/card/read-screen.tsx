import { fromCelsius, toCelsius } from '#shared/lib/units.ts';
import type { StepOf } from '#shared/domain/instruction/instruction-step.ts';
import type { ReadingVerdict } from '#shared/domain/pour-card/judge-reading.ts';
import { judgeHere } from './judge-here.ts';
import { limitWords } from './limit-words.ts';
import { ReadingEntry } from './reading-entry.tsx';
import { SkipStep, type StepProps } from './skip-step.tsx';

/** Colder than any workshop, °C. */
const coldestC = -10;

const judge = ({ running, step }: StepProps<StepOf<'read'>>, typed: number): ReadingVerdict => {
  const { limits, units } = running.card.context;
  const unit = units.temperature;
  const celsius = toCelsius(typed, unit);
  if (celsius < coldestC || celsius > limits.furnaceMaxC) {
    const most = `${Math.round(fromCelsius(limits.furnaceMaxC, unit))} °${unit}`;
    return {
      kind: 'refuse',
      sentence: `${typed} °${unit} cannot be: the furnaces here go to ${most}. Read again.`,
      meant: null,
    };
  }
  const verdict = judgeHere(running, step, { kind: 'read', temperatureC: celsius });
  return verdict.kind === 'good'
    ? { kind: 'accept', celsius }
    : { kind: 'question', celsius, sentence: `${verdict.sentence} Is that right?` };
};

/** A temperature to write down; out of its limits it is questioned once, then taken and marked. */
export const ReadScreen = ({ running, step }: StepProps<StepOf<'read'>>) => (
  <ReadingEntry
    running={running}
    sentence={step.sentence}
    label="Temperature"
    sub={limitWords(step.limitsC, running.write.temperature)}
    judge={(typed) => judge({ running, step }, typed)}
    // Whoever reads writes down what they read; the departure then wants its reason.
    mayConfirm
    onReading={(temperatureC) =>
      void running.record({ type: 'step-done', key: step.key, answer: { kind: 'read', temperatureC } })
    }
    other={<SkipStep running={running} step={step} />}
  />
);
