import { useState } from 'react';
import { photographSubjects, type PhotographSubject } from '#shared/domain/pour-card/card-event.ts';
import { Button } from '#src/ui/button.tsx';
import { TerminalFrame } from '#src/ui/terminal-frame.tsx';
import { Choice } from '#kiosk/lib/choice.tsx';
import type { AsideProps } from './aside-props.ts';
import { AskPhotograph } from './ask-photograph.tsx';
import { useCardClock } from './use-card-clock.ts';

const subjectWords: Readonly<Record<PhotographSubject, string>> = {
  tree: 'The tree',
  defect: 'A fault',
  other: 'Something else',
};

/** A photograph of the tree or of a fault, taken beside the steps. */
export const PhotographAside = ({ running, top, onDone }: AsideProps) => {
  const [of, setOf] = useState<PhotographSubject>('tree');
  const face = useCardClock(running);
  return (
    <AskPhotograph
      back={
        <Button size="terminal" icon="back" onClick={onDone}>
          Back to the card
        </Button>
      }
      onKept={async (picture) => {
        const photographId = await running.keepPhotograph(picture);
        running.record({ type: 'photographed', photographId, of });
        onDone();
      }}
    >
      {(parts) => (
        <TerminalFrame
          {...parts}
          top={top}
          sentence="What does the photograph show?"
          sub={face ? `${face.clock} ${face.words}. The clock runs on.` : undefined}
        >
          <div role="group" aria-label="What it shows" className="grid gap-4">
            {photographSubjects.map((subject) => (
              <Choice
                key={subject}
                isChosen={subject === of}
                onChoose={() => setOf(subject)}
                className="text-[26px]"
              >
                {subjectWords[subject]}
              </Choice>
            ))}
          </div>
        </TerminalFrame>
      )}
    </AskPhotograph>
  );
};
