import { useState, type ReactNode } from 'react';
import { cardStepNames, cardSteps, hotSteps, type CardStep } from '#shared/domain/pour-card/card-step.ts';
import type { CardState } from '#shared/domain/pour-card/card-state.ts';
import { Button } from '#src/ui/button.tsx';
import { CastingTree, type TreeStep } from '#src/ui/casting-tree.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { StopWork } from '#src/ui/stop-work.tsx';
import { TerminalFrame, type TerminalFrameProps } from '#src/ui/terminal-frame.tsx';
import { CardMenu } from './card-menu.tsx';
import { CardTop } from './card-top.tsx';
import { HandOver } from './hand-over.tsx';
import { PhotographAside } from './photograph-aside.tsx';
import { StopQuestion } from './stop-question.tsx';
import type { RunningCard } from './use-running-card.ts';

/** A screen that lies over the step for a while. */
export type Aside = 'stop' | 'hand-over' | 'photograph';

/** Props of {@link CardFrame}: a guided step's parts, and the card they belong to. */
export interface CardFrameProps extends Omit<TerminalFrameProps, 'top' | 'stop' | 'tree' | 'actions'> {
  readonly running: RunningCard;
  /** Buttons of size `terminal`, or what makes them when one of them opens an aside. */
  readonly actions: ReactNode | ((ask: (aside: Aside) => void) => ReactNode);
  /** Whether only a caster may take the card over. */
  readonly handsOver?: boolean;
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

interface AsideScreenProps {
  readonly aside: Aside;
  readonly running: RunningCard;
  readonly top: ReactNode;
  readonly onlyCasters: boolean;
  readonly onDone: () => void;
}

const AsideScreen = ({ aside, running, top, onlyCasters, onDone }: AsideScreenProps) => {
  switch (aside) {
    case 'stop':
      return (
        <StopQuestion
          top={top}
          emergencyText={running.card.instruction.emergencyText}
          onReason={(reason) => {
            onDone();
            running.record({ type: 'stopped', reason });
          }}
          onBack={onDone}
        />
      );
    case 'hand-over':
      return <HandOver running={running} top={top} onlyCasters={onlyCasters} onDone={onDone} />;
    case 'photograph':
      return <PhotographAside running={running} top={top} onDone={onDone} />;
  }
};

/** One guided step of a running card, with the flask's strip, the tree, and stop work at hand on every hot step. */
export const CardFrame = ({ running, actions, handsOver = false, ...parts }: CardFrameProps) => {
  const { card, state, write } = running;
  const [aside, setAside] = useState<Aside | null>(null);
  const isHot = hotSteps.includes(state.step as CardStep) && state.stopped === null;
  const top = <CardTop card={card} write={write} />;
  if (aside && (aside !== 'stop' || isHot)) {
    return (
      <AsideScreen
        aside={aside}
        running={running}
        top={top}
        onlyCasters={handsOver}
        onDone={() => setAside(null)}
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
            <CardMenu card={card} write={write} running={running} onAside={setAside} />
            {isHot ? <StopWork onStop={() => setAside('stop')} /> : null}
          </span>
        }
        tree={<CastingTree steps={treeSteps(state.step)} className="portrait:w-[110px]" />}
        actions={typeof actions === 'function' ? actions(setAside) : actions}
      />
      <RefusalDialog refusal={running.refusal} dismissRefusal={running.dismissRefusal} />
    </>
  );
};
