import { cardStepNames, type CardStep } from '#shared/domain/pour-card/card-step.ts';
import type { CardState } from '#shared/domain/pour-card/card-state.ts';
import { isOver } from '#shared/domain/pour-card/card-state.ts';
import { Button } from '#src/ui/button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { CardFrame } from './card-frame.tsx';
import { useCardClock } from './use-card-clock.ts';
import type { RunningCard } from './use-running-card.ts';

/** Whether the card stands at a part that whoever does it may not do. */
export const isWithheld = (state: CardState): boolean => {
  const parts = state.worker?.parts ?? null;
  return parts !== null && !isOver(state) && !parts.includes(state.step as CardStep);
};

/** A part of the card that is not for this apprentice: a caster takes over. */
export const PartWithheld = ({ running }: { readonly running: RunningCard }) => {
  const face = useCardClock(running);
  return (
    <CardFrame
      running={running}
      sentence={`“${cardStepNames[running.state.step as CardStep]}” is done by a caster. Hand the card over.`}
      {...(face ? { number: face.clock, unit: face.unit } : {})}
      state={<StateMark state="wait" text="A caster takes over" size="terminal" />}
      sub="The owner says which parts an apprentice does. Stay beside it and watch."
      handsOver
      actions={(ask) => (
        <Button kind="main" size="terminal" icon="people" onClick={() => ask('hand-over')}>
          Hand over to a caster
        </Button>
      )}
    />
  );
};
