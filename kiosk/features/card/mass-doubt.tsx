import { Button } from '#src/ui/button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { splitFigure } from '#kiosk/lib/unit-writer.ts';
import { CardFrame } from './card-frame.tsx';
import type { Doubt, MassEntryProps } from './mass-entry.tsx';

/** Props of {@link MassDoubt}. */
export interface MassDoubtProps extends Pick<MassEntryProps, 'running' | 'picture' | 'sub'> {
  readonly doubt: Doubt;
  readonly onAgain: () => void;
  readonly onTake: (grams: number) => void;
}

/** A mass that is not taken as it is: too much for its line, or in another unit; what was weighed is still on the pan. */
export const MassDoubt = ({ running, doubt, picture, sub, onAgain, onTake }: MassDoubtProps) => {
  const { grams, verdict } = doubt;
  const { write } = running;
  const isQuestion = verdict.kind === 'question';
  const { figure, unit } = splitFigure(write.mass(isQuestion ? verdict.overG : grams));
  const meantG = verdict.kind === 'refuse' ? verdict.meantG : null;
  return (
    <CardFrame
      running={running}
      sentence={verdict.sentence}
      number={figure}
      unit={unit}
      state={
        <span role="alert">
          <StateMark
            state="caution"
            text={isQuestion ? 'Too much on the pan' : 'Not taken'}
            size="terminal"
          />
        </span>
      }
      sub={isQuestion ? `${write.mass(grams)} is on the pan.` : sub}
      gauge={picture}
      actions={
        <>
          <Button
            size="terminal"
            icon="scale"
            kind={meantG === null ? 'main' : 'plain'}
            className={isQuestion ? 'grow-2' : undefined}
            onClick={onAgain}
          >
            {isQuestion ? 'Take some off, weigh again' : 'Weigh again'}
          </Button>
          {meantG === null ? null : (
            <Button size="terminal" kind="main" className="grow-2" onClick={() => onTake(meantG)}>
              I meant {write.mass(meantG)}
            </Button>
          )}
          {isQuestion ? (
            <Button size="terminal" className="grow-2" onClick={() => onTake(grams)}>
              Keep it, correct the rest
            </Button>
          ) : null}
        </>
      }
    />
  );
};
