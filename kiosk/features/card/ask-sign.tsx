import type { ReactNode } from 'react';
import type { PersonAtTerminal } from '#shared/contracts/person.ts';
import type { Countersigned } from '#shared/domain/instruction/instruction-step.ts';
import { firstName } from '#kiosk/lib/presence.ts';
import { AskPerson } from './ask-person.tsx';
import { CardFrame } from './card-frame.tsx';
import { useSigners } from './use-people.ts';
import type { RunningCard } from './use-running-card.ts';

/** Props of {@link AskSign}. */
export interface AskSignProps {
  readonly running: RunningCard;
  /** What is signed for. */
  readonly sentence: string;
  readonly state?: ReactNode;
  /** The way back, or past it; null for none. */
  readonly back: ReactNode;
  readonly onSigned: (by: Countersigned) => void;
}

/** Asks a second person to look and sign on this terminal with their own PIN, never whoever does the work. */
export const AskSign = ({ running, sentence, state, back, onSigned }: AskSignProps) => {
  const people = useSigners(running);
  const verify = async (person: PersonAtTerminal, pin: string): Promise<void> =>
    onSigned(await running.sign(person, pin));
  return (
    <AskPerson
      people={people}
      verify={verify}
      needsPin={running.practice === null}
      verb="Look, then sign"
      back={back}
    >
      {({ gauge, actions }, chosen) => (
        <CardFrame
          running={running}
          sentence={sentence}
          state={state}
          sub={
            chosen
              ? `${firstName(chosen.name)} types their own PIN.`
              : running.practice
                ? 'Practice: touch a person; no PIN is asked.'
                : 'A second person looks and signs with their own PIN. Who?'
          }
          gauge={gauge}
          actions={actions}
        />
      )}
    </AskPerson>
  );
};
