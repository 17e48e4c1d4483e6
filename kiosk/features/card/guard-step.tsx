import { Button } from '#src/ui/button.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { Icon } from '#src/ui/icon.tsx';
import { SafetySign } from '#src/ui/safety-sign.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import type { SafetyPrompt } from '#shared/domain/pour-card/work-instruction.ts';
import { useDraft } from '#kiosk/lib/use-draft.ts';
import { CardFrame } from './card-frame.tsx';
import type { RunningCard } from './use-running-card.ts';

interface PromptProps {
  readonly prompt: SafetyPrompt;
  readonly isChecked: boolean;
  readonly onToggle: () => void;
}

const Prompt = ({ prompt, isChecked, onToggle }: PromptProps) => (
  <button
    type="button"
    aria-pressed={isChecked}
    onClick={onToggle}
    className={`flex min-h-18 touch-manipulation items-center gap-4 rounded-[22px] border-[3px] px-3 py-1 text-left select-none ${
      isChecked ? 'border-ink bg-panel' : 'border-dashed border-soft'
    }`}
  >
    <SafetySign sign={prompt.sign} className="size-14" />
    <span className="flex-1 text-[21px] leading-[1.12] font-extrabold">{prompt.sentence}</span>
    <span
      className={`grid size-11 shrink-0 place-items-center rounded-full border-[3px] border-ink ${isChecked ? 'bg-ink text-ground' : ''}`}
    >
      {isChecked ? <Icon name="tick" className="size-7" /> : null}
    </span>
  </button>
);

/** Before anything is hot: each caution is touched when it has been seen to. */
export const GuardStep = ({ running }: { readonly running: RunningCard }) => {
  const { card, record } = running;
  const { prompts, sentences, deference } = card.instruction;
  const [checked, setChecked] = useDraft<readonly string[]>(`guard.${card.melt.id}`, []);
  const left = prompts.filter(({ key }) => !checked.includes(key)).length;
  const toggle = (key: string): void =>
    setChecked(checked.includes(key) ? checked.filter((other) => other !== key) : [...checked, key]);
  return (
    <CardFrame
      running={running}
      sentence={sentences.guard}
      number={String(left)}
      unit="to check"
      state={
        left === 0 ? (
          <StateMark state="ready" text="All checked" size="terminal" />
        ) : (
          <StateMark
            state="wait"
            text={`${prompts.length - left} of ${prompts.length} checked`}
            size="terminal"
          />
        )
      }
      sub={deference}
      gauge={
        <div role="group" aria-label="Cautions" className="grid gap-4">
          {prompts.map((prompt) => (
            <Prompt
              key={prompt.key}
              prompt={prompt}
              isChecked={checked.includes(prompt.key)}
              onToggle={() => toggle(prompt.key)}
            />
          ))}
        </div>
      }
      actions={
        left === 0 ? (
          <HoldButton
            onHeld={() => record({ type: 'guard-confirmed', prompts: prompts.map(({ key }) => key) })}
          >
            Guarded. Hold to go on
          </HoldButton>
        ) : (
          <Button kind="blocked" size="terminal">
            The charge opens when all {prompts.length} are checked
          </Button>
        )
      }
    />
  );
};
