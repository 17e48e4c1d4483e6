import { useState } from 'react';
import type { InstructionStep } from '#shared/domain/instruction/instruction-step.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import type { RunningCard } from './use-running-card.ts';

/** Props of the screens of single steps. */
export interface StepProps<Step extends InstructionStep = InstructionStep> {
  readonly running: RunningCard;
  readonly step: Step;
}

/** Leaves a step out, where the instruction allows it and never to an apprentice; nothing where it may not be. */
export const SkipStep = ({ running, step }: StepProps) => {
  const [isAsking, setIsAsking] = useState(false);
  if (!step.maySkip || running.state.worker?.role === 'apprentice') return null;
  return (
    <>
      <Button size="terminal" onClick={() => setIsAsking(true)}>
        Skip this step
      </Button>
      <Dialog
        open={isAsking}
        onClose={() => setIsAsking(false)}
        title="Leave this step out?"
        size="terminal"
        actions={
          <div className="terminal-actions w-full">
            <Button size="terminal" onClick={() => setIsAsking(false)}>
              Do it after all
            </Button>
            <HoldButton onHeld={() => running.record({ type: 'step-skipped', key: step.key })}>
              Hold to skip it
            </HoldButton>
          </div>
        }
      >
        <p className="leading-snug">
          It is marked on the melt. Before the card is done, a reason and a second person’s sign are asked.
        </p>
      </Dialog>
    </>
  );
};
