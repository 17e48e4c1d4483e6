import type { MeltSummary } from '#shared/contracts/melt.ts';
import { cardStepNames } from '#shared/domain/pour-card/card-step.ts';
import { Icon } from '#src/ui/icon.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';

/** Props of {@link MeltStateMark}. */
export interface MeltStateMarkProps {
  readonly melt: Pick<MeltSummary, 'step' | 'stopped'>;
  readonly size?: 'row' | 'desk';
}

/** Where a melt stands: closed, ended early, stopped, or at a step of its card. */
export const MeltStateMark = ({ melt: { step, stopped }, size = 'row' }: MeltStateMarkProps) => {
  if (stopped) return <StateMark state="stop" text="work stopped" size={size} />;
  if (step === 'abandoned') return <StateMark state="stop" text="ended early" size={size} />;
  if (step !== 'done')
    return <StateMark state="wait" text={`at ${cardStepNames[step].toLowerCase()}`} size={size} />;
  return (
    <span className="inline-flex items-center gap-2 align-bottom font-extrabold text-soft">
      <Icon name="tick" className="size-[18px]" />
      closed
    </span>
  );
};
