import { usePinSignIn } from '#src/api/session.ts';
import { Button } from '#src/ui/button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { TerminalFrame } from '#src/ui/terminal-frame.tsx';
import { firstName } from '#kiosk/lib/presence.ts';
import { useUndelivered } from '#kiosk/outbox/photograph-context.ts';
import type { AsideProps } from './aside-props.ts';
import { AskPerson } from './ask-person.tsx';
import { useCardClock } from './use-card-clock.ts';
import { useSuccessors } from './use-people.ts';

/** Props of {@link HandOver}. */
export interface HandOverProps extends AsideProps {
  readonly onlyCasters?: boolean;
}

/** Gives the card to another person: their tile and PIN sign them in, and the melt book is told that they carry on. */
export const HandOver = ({ running, top, onDone, onlyCasters = false }: HandOverProps) => {
  const people = useSuccessors(running, onlyCasters);
  const { mutateAsync } = usePinSignIn();
  const undelivered = useUndelivered();
  const face = useCardClock(running);
  const name = firstName(running.person.name);
  const clock = face ? { number: face.clock, unit: face.unit } : {};
  const back = (
    <Button size="terminal" icon="back" onClick={onDone}>
      {name} goes on
    </Button>
  );
  if (undelivered > 0) {
    return (
      <TerminalFrame
        top={top}
        sentence={`What ${name} did has to reach the server first.`}
        {...clock}
        state={
          <StateMark
            state="wait"
            text={undelivered === 1 ? '1 record waits' : `${undelivered} records wait`}
            size="terminal"
          />
        }
        sub="It is kept here and goes by itself when the network is back. Then the card can be handed over."
        actions={back}
      />
    );
  }
  return (
    <AskPerson
      people={people}
      verify={async ({ id }, pin) => {
        await mutateAsync({ personId: id, pin });
        onDone();
      }}
      needsPin
      verb="Take it over"
      back={back}
    >
      {({ gauge, actions }, chosen) => (
        <TerminalFrame
          top={top}
          sentence={
            chosen ? `${firstName(chosen.name)}, type your PIN to take it over.` : 'Who takes this card over?'
          }
          {...clock}
          sub={`The melt book shows ${name} until now, and whoever takes over from now on.`}
          gauge={gauge}
          actions={actions}
        />
      )}
    </AskPerson>
  );
};
