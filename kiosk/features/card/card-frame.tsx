import { useState } from 'react';
import { cardStepNames, cardSteps, hotSteps, type CardStep } from '#shared/domain/pour-card/card-step.ts';
import type { CardState } from '#shared/domain/pour-card/card-state.ts';
import { Button } from '#src/ui/button.tsx';
import { CastingTree, type TreeStep } from '#src/ui/casting-tree.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { StopWork } from '#src/ui/stop-work.tsx';
import { TerminalFrame, type TerminalFrameProps } from '#src/ui/terminal-frame.tsx';
import { CardMenu } from './card-menu.tsx';
import { CardTop } from './card-top.tsx';
import { StopQuestion } from './stop-question.tsx';
import type { RunningCard } from './use-running-card.ts';

/** Props of {@link CardFrame}: a guided step's parts, and the card they belong to. */
export interface CardFrameProps extends Omit<TerminalFrameProps, 'top' | 'stop' | 'tree'> {
  readonly running: RunningCard;
}

/** The buds of the tree for a card that stands at `step`. */
export const treeSteps = (step: CardState['step']): readonly TreeStep[] => {
  const at = step === 'done' ? cardSteps.length : cardSteps.indexOf(step as CardStep);
  return cardSteps.map((key, index) => ({
    key,
    label: cardStepNames[key],
    state: index < at ? 'done' : index === at ? 'current' : 'todo',
  }));
};

const RefusalDialog = ({ refusal, dismissRefusal }: Pick<RunningCard, 'refusal' | 'dismissRefusal'>) => (
  <Dialog
    open={refusal !== null}
    onClose={dismissRefusal}
    title="Not recorded"
    size="terminal"
    dismissible={false}
    actions={
      <Button kind="main" size="terminal" className="flex-1" onClick={dismissRefusal}>
        Understood
      </Button>
    }
  >
    <p className="text-[34px] leading-tight font-extrabold">{refusal}</p>
  </Dialog>
);

/** One guided step of a running card, with the flask's strip, the tree, and stop work at hand on every hot step. */
export const CardFrame = ({ running, ...parts }: CardFrameProps) => {
  const { card, state, write } = running;
  const [isStopping, setIsStopping] = useState(false);
  const isHot = hotSteps.includes(state.step as CardStep) && state.stopped === null;
  const menu = <CardMenu card={card} write={write} />;
  const top = <CardTop card={card} write={write} />;
  if (isStopping && isHot) {
    return (
      <StopQuestion
        top={top}
        emergencyText={card.instruction.emergencyText}
        onReason={(reason) => {
          setIsStopping(false);
          running.record({ type: 'stopped', reason });
        }}
        onBack={() => setIsStopping(false)}
      />
    );
  }
  return (
    <>
      <TerminalFrame
        {...parts}
        top={top}
        stop={
          <span className="flex items-center gap-2">
            {menu}
            {isHot ? <StopWork onStop={() => setIsStopping(true)} /> : null}
          </span>
        }
        tree={<CastingTree steps={treeSteps(state.step)} className="portrait:w-[110px]" />}
      />
      <RefusalDialog refusal={running.refusal} dismissRefusal={running.dismissRefusal} />
    </>
  );
};
