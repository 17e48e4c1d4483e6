import { Button } from '#src/ui/button.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { Icon } from '#src/ui/icon.tsx';
import { SafetySign } from '#src/ui/safety-sign.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import type { InstructionStep, StepOf } from '#shared/domain/instruction/instruction-step.ts';
import { openRun, openSteps } from '#shared/domain/pour-card/apply-steps.ts';
import { cardStepNames, type CardStep } from '#shared/domain/pour-card/card-step.ts';
import { useDraft } from '#kiosk/lib/use-draft.ts';
import { CardFrame } from './card-frame.tsx';
import type { RunningCard } from './use-running-card.ts';

interface CheckProps {
  readonly step: StepOf<'check'>;
  readonly isChecked: boolean;
  readonly onToggle: () => void;
}

const Check = ({ step, isChecked, onToggle }: CheckProps) => (
  <button
    type="button"
    aria-pressed={isChecked}
    onClick={onToggle}
    className={`flex min-h-18 touch-manipulation items-center gap-4 rounded-[22px] border-[3px] px-3 py-1 text-left select-none ${
      isChecked ? 'border-ink bg-panel' : 'border-dashed border-soft'
    }`}
  >
    {step.sign ? <SafetySign sign={step.sign} className="size-14" /> : null}
    <span className="flex-1 text-[21px] leading-[1.12] font-extrabold">{step.sentence}</span>
    <span
      className={`grid size-11 shrink-0 place-items-center rounded-full border-[3px] border-ink ${isChecked ? 'bg-ink text-ground' : ''}`}
    >
      {isChecked ? <Icon name="tick" className="size-7" /> : null}
    </span>
  </button>
);

const Words = ({ sentence, isLarge }: { readonly sentence: string; readonly isLarge: boolean }) => (
  <p
    className={`rounded-[22px] border-[3px] border-line bg-panel font-extrabold text-pretty ${
      isLarge ? 'px-7 py-6 text-[34px] leading-[1.2]' : 'px-5 py-3 text-[24px] leading-tight'
    }`}
  >
    {sentence}
  </p>
);

/** So many words alone have room for large letters. */
const fewWords = 3;

const isCheck = (step: InstructionStep): step is StepOf<'check'> => step.kind === 'check';

const sentenceOf = ({ card, state }: RunningCard): string =>
  state.step === 'guard'
    ? card.instruction.sentences.guard
    : `Before “${cardStepNames[state.step as CardStep]}”: look, and touch to go on.`;

/** Words to read and cautions to touch, shown together; the guard is one of them. */
export const CheckRun = ({ running }: { readonly running: RunningCard }) => {
  const { card, state, record } = running;
  const open = openSteps(state, card.context);
  const run = openRun(open);
  const checks = run.filter(isCheck);
  const [checked, setChecked] = useDraft<readonly string[]>(
    `checks.${card.melt.id}.${run[0]?.key ?? state.step}`,
    [],
  );
  const left = checks.filter(({ key }) => !checked.includes(key)).length;
  const endsGuard = state.step === 'guard' && run.length === open.length;
  const keys = run.map(({ key }) => key);
  const toggle = (key: string): void =>
    setChecked(checked.includes(key) ? checked.filter((other) => other !== key) : [...checked, key]);
  return (
    <CardFrame
      running={running}
      sentence={sentenceOf(running)}
      {...(checks.length > 0 ? { number: String(left), unit: 'to check' } : {})}
      state={
        left === 0 ? (
          <StateMark state="ready" text={checks.length > 0 ? 'All checked' : 'Read this'} size="terminal" />
        ) : (
          <StateMark
            state="wait"
            text={`${checks.length - left} of ${checks.length} checked`}
            size="terminal"
          />
        )
      }
      sub={card.instruction.deference}
      gauge={
        <div role="group" aria-label="Cautions" className="grid min-h-full content-center gap-4">
          {run.map((step) =>
            isCheck(step) ? (
              <Check
                key={step.key}
                step={step}
                isChecked={checked.includes(step.key)}
                onToggle={() => toggle(step.key)}
              />
            ) : (
              <Words
                key={step.key}
                sentence={step.sentence}
                isLarge={checks.length === 0 && run.length <= fewWords}
              />
            ),
          )}
        </div>
      }
      actions={
        left === 0 ? (
          <HoldButton
            onHeld={() =>
              record(endsGuard ? { type: 'guard-confirmed', prompts: keys } : { type: 'checked', keys })
            }
          >
            {endsGuard ? 'Guarded. Hold to go on' : 'Hold to go on'}
          </HoldButton>
        ) : (
          <Button kind="blocked" size="terminal">
            It goes on when all {checks.length} are checked
          </Button>
        )
      }
    />
  );
};
