import { useState, type ReactNode } from 'react';
import type { PersonAtTerminal } from '#shared/contracts/person.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { Icon } from '#src/ui/icon.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { PinPad } from '#src/ui/pin-pad.tsx';
import { Spinner } from '#src/ui/spinner.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { usePinAttempts } from '#kiosk/lib/use-pin-attempts.ts';
import type { People } from './use-people.ts';

/** The parts of a screen that asks for a person. */
export interface AskPersonParts {
  readonly gauge: ReactNode;
  readonly actions: ReactNode;
}

/** Props of {@link AskPerson}. */
export interface AskPersonProps {
  readonly people: People;
  /** Verifies the person chosen; rejects with why not. */
  readonly verify: (person: PersonAtTerminal, pin: string) => Promise<unknown>;
  /** False where any person is taken by their tile alone. */
  readonly needsPin: boolean;
  /** What the last button says, such as "Sign". */
  readonly verb: string;
  /** The way back, at the left of the actions; null for none. */
  readonly back: ReactNode;
  /** Puts the parts into the screen that asks. */
  readonly children: (parts: AskPersonParts, chosen: PersonAtTerminal | null) => ReactNode;
}

const Tiles = ({
  people: { people, error, nobody },
  onChoose,
}: {
  readonly people: People;
  readonly onChoose: (person: PersonAtTerminal) => void;
}) => {
  if (!people && error) return <Notice kind="error" size="terminal" title={sentenceOf(error)} />;
  if (!people) return <Spinner label="Fetching the people" />;
  if (people.length === 0) return <Notice kind="empty" size="terminal" title={nobody} />;
  return (
    <ul aria-label="People" className="grid max-h-full content-start gap-4 overflow-y-auto p-1">
      {people.map((person) => (
        <li key={person.id} className="grid">
          <button
            type="button"
            onClick={() => onChoose(person)}
            className="flex min-h-24 touch-manipulation items-center gap-5 rounded-[26px] border-[3px] border-ink bg-panel px-6 text-left select-none active:bg-ember-soft"
          >
            <Icon name="person" className="size-11" />
            <span className="grid">
              <span className="text-[28px] leading-tight font-black">{person.name}</span>
              <span className="text-xl text-soft">{person.roles.join(', ')}</span>
            </span>
          </button>
        </li>
      ))}
    </ul>
  );
};

interface PinProps extends Pick<AskPersonProps, 'verify' | 'verb' | 'children'> {
  readonly person: PersonAtTerminal;
  readonly onBack: () => void;
}

const Pin = ({ person, verify, verb, children, onBack }: PinProps) => {
  const attempts = usePinAttempts((pin) => verify(person, pin));
  const { isOpen, isReady, isLocked, words } = attempts;
  const gauge = (
    <div className="grid content-start gap-4 [&_[role=group]>div]:!grid-rows-[repeat(4,76px)]">
      <div role="alert" className="min-h-11">
        {words ? <StateMark state={attempts.state} text={words} size="desk" /> : null}
      </div>
      <PinPad
        label={`PIN of ${person.name}`}
        value={attempts.pin}
        onChange={attempts.setPin}
        onEnter={attempts.send}
        disabled={!isOpen}
      />
    </div>
  );
  const actions = (
    <>
      <Button size="terminal" icon="people" onClick={onBack}>
        Someone else
      </Button>
      <Button
        kind={isReady && isOpen ? 'main' : 'blocked'}
        size="terminal"
        className="grow-2"
        busy={attempts.isBusy}
        onClick={attempts.send}
      >
        {isLocked ? 'Locked' : isReady ? verb : 'Type the PIN'}
      </Button>
    </>
  );
  return children({ gauge, actions }, person);
};

/** Asks for another person on this terminal: a tile, then the PIN. */
export const AskPerson = ({ people, needsPin, back, ...rest }: AskPersonProps) => {
  const [chosen, setChosen] = useState<PersonAtTerminal | null>(null);
  if (chosen) return <Pin key={chosen.id} {...rest} person={chosen} onBack={() => setChosen(null)} />;
  const choose = (person: PersonAtTerminal): void => {
    if (needsPin) setChosen(person);
    else void rest.verify(person, '');
  };
  return rest.children({ gauge: <Tiles people={people} onChoose={choose} />, actions: back }, null);
};
